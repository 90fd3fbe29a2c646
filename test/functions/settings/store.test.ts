import { afterEach, describe, expect, it, vi } from 'vitest';
import { DEFAULT_SETTINGS } from '../../../functions/settings/settings';
import { createSettingsStore, type StoreState } from '../../../functions/settings/store';

const ready = (stamp: string): StoreState => ({ state: 'ready', settings: DEFAULT_SETTINGS, stamp });
const broken: StoreState = { state: 'broken', cell: 'Units!B3', text: 'kPaa', message: 'no unit' };

describe('the settings store', () => {
  afterEach(() => void vi.useRealTimers());

  it('starts unread and tells subscribers of changes only', () => {
    const store = createSettingsStore();
    const seen: string[] = [];
    const stop = store.subscribe((state) => void seen.push(state.state));
    expect(store.current()).toEqual({ state: 'unread' });
    expect(store.publish({ state: 'absent' })).toBe(true);
    expect(store.publish({ state: 'absent' })).toBe(false);
    expect(store.publish(ready('a'))).toBe(true);
    expect(store.publish(ready('a'))).toBe(false);
    expect(store.publish(ready('b'))).toBe(true);
    expect(store.publish(broken)).toBe(true);
    expect(store.publish({ ...broken })).toBe(false);
    expect(store.publish({ ...broken, text: 'kPab' })).toBe(true);
    stop();
    store.publish({ state: 'absent' });
    expect(seen).toEqual(['absent', 'ready', 'ready', 'broken', 'broken']);
    expect(store.current()).toEqual({ state: 'absent' });
  });

  it('a listener that ends itself, or comes twice, disturbs nobody', () => {
    const store = createSettingsStore();
    const calls: string[] = [];
    const stop = store.subscribe(() => {
      calls.push('once');
      stop();
    });
    const listener = (): void => void calls.push('twice');
    const first = store.subscribe(listener);
    store.subscribe(listener);
    store.publish(ready('a'));
    first();
    store.publish(ready('b'));
    expect(calls).toEqual(['once', 'twice', 'twice', 'twice']);
  });

  it('whenRead gives what is known at once, or waits for it', async () => {
    const store = createSettingsStore();
    const waiting = store.whenRead(30_000);
    store.publish(ready('a'));
    expect(await waiting).toMatchObject({ state: 'ready', stamp: 'a' });
    store.publish(broken);
    expect(await store.whenRead(0)).toEqual(broken);
  });

  it('whenRead ends with unread once its time has passed', async () => {
    vi.useFakeTimers();
    const store = createSettingsStore();
    const settled = vi.fn();
    const waiting = store.whenRead(30_000).then(settled);
    await vi.advanceTimersByTimeAsync(29_999);
    expect(settled).not.toHaveBeenCalled();
    await vi.advanceTimersByTimeAsync(1);
    await waiting;
    expect(settled).toHaveBeenCalledWith({ state: 'unread' });
    expect(vi.getTimerCount()).toBe(0);
  });

  it('leaves no timer behind when the settings come', async () => {
    vi.useFakeTimers();
    const store = createSettingsStore();
    const waiting = store.whenRead(30_000);
    store.publish({ state: 'absent' });
    await waiting;
    expect(vi.getTimerCount()).toBe(0);
  });
});
