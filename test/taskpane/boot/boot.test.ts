import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { settingsStore } from '../../../functions/settings/store';
import { boot } from '../../../taskpane/boot/boot';
import { FakeExcel } from '../hosts/fakeExcel';
import { MemoryWorkbook } from '../memoryWorkbook';

/** As much of an element as the notice writes. */
class Part {
  className = '';
  href = '';
  textContent: string | null = null;
  readonly children: (Part | string)[] = [];
  readonly ownerDocument = { createElement: () => new Part() };
  setAttribute(): void {
    // Roles are looked at in the browser tests.
  }
  append(...parts: (Part | string)[]): void {
    this.children.push(...parts);
  }
  replaceChildren(...parts: (Part | string)[]): void {
    this.children.splice(0, this.children.length, ...parts);
  }
  words(): string {
    return [
      this.textContent ?? '',
      ...this.children.map((part) => (typeof part === 'string' ? part : part.words())),
    ].join('');
  }
}

describe('boot', () => {
  let element: Part;
  let seen: ((entries: { isIntersecting: boolean }[]) => void) | undefined;
  const asElement = () => element as unknown as HTMLElement;
  beforeEach(() => {
    element = new Part();
    seen = undefined;
    settingsStore.publish({ state: 'unread' });
    vi.stubGlobal(
      'IntersectionObserver',
      class {
        constructor(callback: (entries: { isIntersecting: boolean }[]) => void) {
          seen = callback;
        }
        observe = () => undefined;
        disconnect = () => undefined;
      },
    );
  });
  afterEach(() => {
    vi.unstubAllGlobals();
  });

  function inExcel(host: string | null = 'Excel'): FakeExcel {
    const fake = new FakeExcel(new MemoryWorkbook());
    const { Excel, Office } = fake.globals();
    vi.stubGlobal('Excel', Excel);
    vi.stubGlobal('Office', { ...(Office as object), onReady: () => Promise.resolve({ host, platform: null }) });
    return fake;
  }

  it('points to Excel and the local page in a plain browser, with and without the platform script', async () => {
    const loadPane = vi.fn();
    await boot(asElement(), loadPane);
    expect(element.words()).toContain('inside Excel');
    expect(element.words()).toContain('local workbook page');
    inExcel(null);
    element.replaceChildren();
    await boot(asElement(), loadPane);
    expect(element.words()).toContain('inside Excel');
    expect(loadPane).not.toHaveBeenCalled();
    expect(settingsStore.current().state).toBe('unread');
  });

  it('reads the settings before anyone sees the pane, and loads the pane only then', async () => {
    inExcel();
    const mountPane = vi.fn(() => () => undefined);
    const loadPane = vi.fn(() => Promise.resolve({ mountPane }));
    const booted = boot(asElement(), loadPane);
    await vi.waitFor(() => {
      expect(seen).toBeDefined();
    });
    expect(settingsStore.current()).toEqual({ state: 'absent' });
    seen?.([{ isIntersecting: false }]);
    expect(loadPane).not.toHaveBeenCalled();
    seen?.([{ isIntersecting: true }]);
    await booted;
    expect(mountPane).toHaveBeenCalledOnce();
    expect(mountPane).toHaveBeenCalledWith(expect.objectContaining({ locale: { decimal: '.', list: ',' } }), element);
  });

  it('shows why it could not start, and does not hide it from the browser', async () => {
    inExcel();
    const booted = boot(asElement(), () => Promise.reject(new Error('chunk not found')));
    const failed = expect(booted).rejects.toThrow('chunk not found');
    await vi.waitFor(() => {
      expect(seen).toBeDefined();
    });
    seen?.([{ isIntersecting: true }]);
    await failed;
    expect(element.words()).toContain('Latentry could not start: chunk not found');
  });
});
