import { takeMissed } from '../../functions/house/currentRegistry';
import { houseStore } from '../../functions/house/store';
import { settingsStore } from '../../functions/settings/store';
import { parseArea } from '../hosts/address';
import type { HostEvent, Ref, WorkbookHost } from '../port';
import { coalesced } from './coalesced';
import { OUR_FORMULA } from './formulaCells';
import { readSnapshot, UNITS_NAME, type Snapshot } from './readSnapshot';
import { recalculateOurs } from './recalculateOurs';
import { staleness } from './staleness';
import { editionNow, readStamp, stampOf, writeStamp, type Stamp } from './stamp';

/** Soon after an edit of the settings; more calmly after each calculation. */
const AFTER_EDIT_MS = 100;
const AFTER_CALCULATION_MS = 1000;
/** A host that cannot be read, busy or in a dialog, is asked again: after 0.5, 1, 2, 4, 8 s. */
const FIRST_RETRY_MS = 500;
const MOST_RETRIES = 5;

/**
 * Keeps the stores equal to the Units block and the Substances block of the workbook, and the values of formulas that
 * rest on them equal to what they say. Resolves once both have been published; the result stops it.
 */
export async function startSettings(host: WorkbookHost): Promise<() => void> {
  const watch = new SettingsWatch(host);
  await watch.start();
  return () => {
    watch.stop();
  };
}

/** A first formula of ours is looked for in edits of ordinary size only. */
function isSmall(ref: Ref): boolean {
  const area = parseArea(ref.address);
  return area !== null && area.rows * area.columns <= 10_000;
}

class SettingsWatch {
  private snapshot: Snapshot | undefined;
  private stamp: Stamp | null = null;
  private failures = 0;
  private readonly edited: Ref[] = [];
  private onlyRemote = true;
  private scan = new AbortController();
  private readonly stops: (() => void)[];
  private readonly refreshes = coalesced(
    () => this.refresh(),
    (error) => {
      this.retry(error);
    },
  );
  private started: () => void = () => undefined;

  constructor(private readonly host: WorkbookHost) {
    this.stops = [
      host.on('change', (event) => {
        this.changed(event);
      }),
      host.on('calculated', () => {
        this.refreshes.request(AFTER_CALCULATION_MS);
      }),
      host.on('activated', () => {
        this.refreshes.request(AFTER_EDIT_MS);
      }),
    ];
  }

  start(): Promise<void> {
    return new Promise((resolve) => {
      this.started = resolve;
      this.refreshes.request(0);
    });
  }

  stop(): void {
    for (const stop of this.stops) stop();
    this.refreshes.stop();
    this.scan.abort();
    this.started();
  }

  private changed({ ref, remote, own }: HostEvent): void {
    if (!remote) this.onlyRemote = false;
    const sheet = ref?.sheet.toLowerCase();
    const settings = sheet === undefined || this.snapshot === undefined || this.snapshot.sheets.has(sheet);
    const unstamped = this.stamp === null && ref !== undefined && !remote && isSmall(ref);
    if (unstamped) this.edited.push(ref);
    if (settings || unstamped) this.refreshes.request(own ? 0 : AFTER_EDIT_MS);
  }

  private async refresh(): Promise<void> {
    const next = await readSnapshot(this.host);
    this.failures = 0;
    const last = this.snapshot;
    const remote = this.onlyRemote && last !== undefined;
    this.onlyRemote = true;
    this.snapshot = next;
    // Before the settings, which formulas wait for.
    if (last?.house !== next.house || last.substances.state !== next.substances.state) {
      houseStore.publish(next.substances);
    }
    if (last?.settings !== next.settings) settingsStore.publish(next.store);
    this.started();
    if (last === undefined) await this.compareStamp(next);
    else if (last.settings !== next.settings || last.house !== next.house) await this.act(last, next, remote);
    else await this.stampFirstFormula(next);
  }

  /** On load: values of other settings are computed anew; values of another edition are reported. */
  private async compareStamp(next: Snapshot): Promise<void> {
    this.stamp = await readStamp(this.host);
    if (this.stamp === null) {
      const cells = await recalculateOurs(this.host, 'all', this.fresh());
      if (cells.length > 0 || next.store.state !== 'absent') await this.write(stampOf(next, editionNow()));
      return;
    }
    const { edition } = this.stamp;
    const same = edition === editionNow();
    staleness.publish(same ? { state: 'fresh' } : { state: 'stale', from: edition, to: editionNow() });
    if (this.stamp.settings !== next.settings || this.stamp.house !== next.house)
      await this.act(this.stamp, next, false);
    else if (takeMissed()) await recalculateOurs(this.host, 'all', this.fresh());
  }

  /** Only a changed snapshot gets here. */
  private async act(last: Pick<Snapshot, 'house'>, next: Snapshot, remote: boolean): Promise<void> {
    const which = takeMissed() || last.house !== next.house ? 'all' : 'store';
    const signal = this.fresh();
    await recalculateOurs(this.host, which, signal);
    if (signal.aborted || remote) return;
    await this.write(stampOf(next, this.stamp?.edition ?? editionNow()));
  }

  /** The stamp comes with the first formula of ours, so that other workbooks stay untouched. */
  private async stampFirstFormula(next: Snapshot): Promise<void> {
    const edited = this.edited.splice(0);
    if (this.stamp !== null || edited.length === 0) return;
    const blocks = await this.host.read(edited);
    const ours = blocks.some(({ formulas }) => formulas.some((row) => row.some((text) => OUR_FORMULA.test(text))));
    if (ours) await this.write(stampOf(next, editionNow()));
  }

  private async write(stamp: Stamp): Promise<void> {
    await writeStamp(this.host, stamp);
    this.stamp = stamp;
  }

  private fresh(): AbortSignal {
    this.scan.abort();
    this.scan = new AbortController();
    return this.scan.signal;
  }

  private retry(error: unknown): void {
    this.failures += 1;
    if (this.failures <= MOST_RETRIES) {
      this.refreshes.request(FIRST_RETRY_MS * 2 ** (this.failures - 1));
      return;
    }
    this.failures = 0;
    if (this.snapshot !== undefined) return;
    const message = `the workbook could not be read: ${error instanceof Error ? error.message : String(error)}`;
    settingsStore.publish({ state: 'broken', cell: UNITS_NAME, text: '', message });
    this.started();
  }
}
