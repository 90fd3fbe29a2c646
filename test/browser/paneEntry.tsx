import { constant } from '../../functions/constant';
import { deltaCp } from '../../functions/deltaCp';
import { fitDeltaCp } from '../../functions/fitDeltaCp';
import { fitLatent } from '../../functions/fitLatent';
import { heatCap } from '../../functions/heatCap';
import { latent } from '../../functions/latent';
import { satPressure } from '../../functions/satPressure';
import { settingsStore } from '../../functions/settings/store';
import { startSettings } from '../../taskpane/boot/startSettings';
import { parseArea, parseReference } from '../../taskpane/hosts/address';
import { mountPane } from '../../taskpane/pane/mount';
import type { Cell, Ref } from '../../taskpane/port';
import { memoryHost, type MemoryHost } from '../taskpane/memoryHost';

/** What the tests reach into: the workbook behind the pane. */
export interface PaneTest {
  readonly host: MemoryHost;
  readonly store: typeof settingsStore;
  readonly unmount: () => void;
  /** Begins to watch the settings, as the add-in does when it is ready. */
  start(): Promise<void>;
}

class CellError extends Error {
  constructor(
    readonly code: string,
    message?: string,
  ) {
    super(message ?? code);
  }
}
Object.assign(globalThis, {
  CustomFunctions: {
    associate: () => undefined,
    Error: CellError,
    ErrorCode: { invalidValue: '#VALUE!', notAvailable: '#N/A' },
  },
});

const host: MemoryHost = memoryHost({ evaluate: (formula, at) => evaluate(formula, at) });

/** The real functions behind the formulas that the pane writes: ranges, the Units name, texts, numbers, left-out arguments. */
function evaluate(formula: string, at: Ref): Cell | Cell[][] {
  const [, name = '', inner = ''] = /^=LATENTRY\.(\w+)\((.*)\)$/.exec(formula) ?? [];
  try {
    const args = (inner.match(/("[^"]*"|[^,"]*)(,|$)/g) ?? []).map((part) => argument(part.replace(/,$/, ''), at));
    if (name === 'FITDELTACP')
      return fitDeltaCp(args[0] ?? [], args[1] ?? [], args[2], args[3], rest(args, 4)) as Cell[][];
    if (name === 'FITLATENT') return fitLatent(args[0] ?? [], args[1] ?? [], rest(args, 2)) as Cell[][];
    if (name === 'LATENT') return latent(args[0] ?? [], args[1] ?? [], args[2], rest(args, 3)) as Cell[][];
    if (name === 'DELTACP') return deltaCp(args[0] ?? [], args[1] ?? [], args[2], rest(args, 3)) as Cell[][];
    if (name === 'SATPRESSURE') return satPressure(args[0] ?? [], args[1] ?? [], rest(args, 2)) as Cell[][];
    if (name === 'CONSTANT') return constant(args[0] ?? [], args[1] ?? [], rest(args, 2)) as Cell[][];
    if (name === 'HEATCAP')
      return heatCap(args[0] ?? [], args[1] ?? [], args[2] ?? [], args[3], args[4], rest(args, 5)) as Cell[][];
  } catch (error) {
    if (error instanceof CellError) return { error: error.code as '#VALUE!', message: error.message };
    throw error;
  }
  return { error: '#NAME?' };
}

type Grid = unknown[][];

const rest = (args: readonly (Grid | undefined)[], from: number): Grid[] =>
  args.slice(from).filter((arg) => arg !== undefined);

function argument(text: string, at: Ref): Grid | undefined {
  if (text === '') return undefined;
  if (text.startsWith('"')) return [[text.slice(1, -1)]];
  if (/^-?[\d.]+$/.test(text)) return [[Number(text)]];
  const own = parseArea(text) === null ? undefined : { sheet: at.sheet, address: text };
  const ref = own ?? parseReference(text) ?? host.book.names.get(text.toLowerCase())?.ref;
  if (ref === undefined || ref === 'broken') throw new CellError('#NAME?');
  return host.book.values(ref);
}

host.book.addSheet('Data');
const element = document.getElementById('pane');
if (element === null) throw new Error('the page has no element for the pane');
const unmount = mountPane(host, element);
const start = async (): Promise<void> => {
  await startSettings(host);
};

Object.assign(globalThis, { paneTest: { host, store: settingsStore, unmount, start } satisfies PaneTest });
