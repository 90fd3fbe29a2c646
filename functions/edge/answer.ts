import { Problem } from '../../core/problem';
import { DEFAULT_SETTINGS, settingsFor, type Settings } from '../settings/settings';
import { isHouseBlock } from '../house/isHouseBlock';
import { plainKey, SETTINGS } from '../settings/schema';
import { settingsStore, type StoreState } from '../settings/store';
import { blockOf, type Block } from './block';
import { needsBlankCheck, withBlanks } from './blanks';
import { CellFault } from './cell';
import { errorOf, faultOf } from './cellError';
import { runCellwise } from './cellwise';
import { hotCall } from './hotCall';
import { receive, type Invocation } from './invocation';
import type { CellwiseSpec, Element, Spec } from './spec';

/** How long a formula waits for the workbook's settings to be read. */
const LONGEST_WAIT_MS = 30_000;

/** The option that every function knows. */
const COMMON_OPTIONS: readonly string[] = ['answer'];

/**
 * The one body of every cell function: reads the arguments and the settings, computes, and maps problems to
 * cell errors. Gives the finished table at once where it can, else a promise of it (settings still unread,
 * or zeros to be told from blanks).
 */
// eslint-disable-next-line @typescript-eslint/no-explicit-any -- the host's own type for a matrix
export function answer(spec: Spec, raw: readonly unknown[]): any {
  const { args, invocation } = receive(raw);
  const { positional, parts } = takeSettings(spec, args);
  const state = settingsStore.current();
  const quick = spec.family === 'cellwise' ? quickly(spec, positional, parts, state) : undefined;
  if (quick !== undefined) return quick;
  const blocks = spec.args.map((arg, i) => blockAt(arg.name, arg.optional === true, positional[i], i, invocation));
  const waits = state.state === 'unread' && !parts.some(isWholeBlock);
  const unsure = blocks.some((block) => block !== undefined && needsBlankCheck(block.cells, block.address));
  if (!waits && !unsure) return finish(spec, blocks, parts, state);
  return later(spec, blocks, parts, waits);
}

/** `hotCall` under the settings in force, where these can be had without waiting and without a problem. */
function quickly(
  spec: CellwiseSpec,
  positional: readonly unknown[],
  parts: readonly unknown[],
  state: StoreState,
): unknown[][] | undefined {
  if (state.state !== 'ready' && state.state !== 'absent') return undefined;
  const base = state.state === 'ready' ? state.settings : DEFAULT_SETTINGS;
  if (parts.length === 0) return hotCall(spec, positional, base);
  try {
    const under = parts.some(isWholeBlock) ? DEFAULT_SETTINGS : base;
    return hotCall(spec, positional, settingsFor(parts, under, optionsOf(spec)));
  } catch (thrown) {
    if (thrown instanceof Problem) return undefined;
    throw thrown;
  }
}

async function later(
  spec: Spec,
  blocks: readonly (Block | undefined)[],
  parts: readonly unknown[],
  waits: boolean,
): Promise<unknown[][]> {
  const state = waits ? await settingsStore.whenRead(LONGEST_WAIT_MS) : settingsStore.current();
  const read = await Promise.all(
    blocks.map(async (block) =>
      block !== undefined && needsBlankCheck(block.cells, block.address)
        ? { ...block, cells: await withBlanks(block.cells, block.address) }
        : block,
    ),
  );
  return finish(spec, read, parts, state);
}

function finish(
  spec: Spec,
  blocks: readonly (Block | undefined)[],
  parts: readonly unknown[],
  state: StoreState,
): unknown[][] {
  let settings: Settings | undefined;
  try {
    settings = settingsFor(parts, parts.some(isWholeBlock) ? DEFAULT_SETTINGS : ambient(state), optionsOf(spec));
    const table: Element[][] =
      spec.family === 'cellwise' ? runCellwise(spec, blocks, settings) : spec.run(blocks, settings);
    return sealed(table);
  } catch (thrown) {
    throw errorOf(faultOf(thrown, settings));
  }
}

const optionLists = new WeakMap<Spec, readonly string[]>();

function optionsOf(spec: Spec): readonly string[] {
  let list = optionLists.get(spec);
  if (list === undefined) {
    list = [...COMMON_OPTIONS, ...spec.options];
    optionLists.set(spec, list);
  }
  return list;
}

/** The workbook's own settings, for formulas that do not pass the Units block. */
function ambient(state: StoreState): Settings {
  switch (state.state) {
    case 'ready':
      return state.settings;
    case 'absent':
      return DEFAULT_SETTINGS;
    case 'broken':
      throw new Problem({
        code: 'argument',
        argument: `the Units sheet, cell ${state.cell}`,
        allowed: state.message,
        received: `"${state.text}"`,
      });
    case 'unread':
      throw new Problem({
        code: 'missing',
        subject: 'unit settings',
        reason: 'the workbook has not been read yet; recalculate, or pass Latentry_units',
      });
  }
}

/** A block with a row for every setting stands by itself; a smaller one is put onto the workbook's own settings. */
function isWholeBlock(part: unknown): boolean {
  const large = Array.isArray(part) && part.length >= SETTINGS.length && Array.isArray(part[0]) && part[0].length > 1;
  return large && !isHouseBlock(part);
}

function isUnitsBlock(part: unknown): boolean {
  return (
    Array.isArray(part) && Array.isArray(part[0]) && part[0].length > 1 && LABELS.has(plainKey(String(part[0][0])))
  );
}

const LABELS: ReadonlySet<string> = new Set(SETTINGS.flatMap((row) => [plainKey(row.label), plainKey(row.key)]));

function isSettings(part: unknown): boolean {
  return isSettingsText(part) || isUnitsBlock(part) || isHouseBlock(part);
}

/** A settings text has an equals sign, which no quantity has. */
function isSettingsText(part: unknown): boolean {
  return (
    Array.isArray(part) &&
    part.length === 1 &&
    Array.isArray(part[0]) &&
    typeof part[0][0] === 'string' &&
    part[0][0].includes('=')
  );
}

/**
 * Settings may stand in the place of an optional quantity that is left out: `LATENT("water","fusion",Latentry_units)`.
 * A Units block, a block of substances and a settings text cannot be mistaken for a quantity.
 */
function takeSettings(
  spec: Spec,
  args: readonly unknown[],
): { positional: readonly unknown[]; parts: readonly unknown[] } {
  const count = spec.args.length;
  let positional: unknown[] | undefined;
  const early: unknown[] = [];
  for (let i = 0; i < count && i < args.length; i++) {
    if (spec.args[i]?.optional !== true || !isSettings(args[i])) continue;
    positional ??= [...args];
    positional[i] = undefined;
    early.push(args[i]);
  }
  const rest = settingsParts(args.slice(count));
  return { positional: positional ?? args, parts: early.length === 0 ? rest : [...early, ...rest] };
}

/** Everything after the named arguments is a settings part: repeated as a list of blocks, or bare. */
function settingsParts(rest: readonly unknown[]): readonly unknown[] {
  const parts: unknown[] = [];
  for (const item of rest) {
    if (item === null || item === undefined) continue;
    if (Array.isArray(item) && Array.isArray(item[0]) && Array.isArray(item[0][0])) parts.push(...(item as unknown[]));
    else parts.push(item);
  }
  return parts;
}

function blockAt(
  name: string,
  optional: boolean,
  raw: unknown,
  index: number,
  invocation: Invocation,
): Block | undefined {
  const addresses = invocation.parameterAddresses;
  const block = blockOf(name, raw, addresses?.[index] ?? undefined);
  if (block === undefined) return undefined;
  const only = block.rows === 1 && block.columns === 1 ? block.cells[0]?.[0] : undefined;
  // Where addresses are told, an optional empty cell without one was skipped, not pointed at.
  const skipped = optional && addresses !== undefined && block.address === undefined && (only === null || only === '');
  return skipped ? undefined : block;
}

/** Faults become the host's errors in their place; a single fault is thrown; no NaN or Infinity leaves. */
function sealed(table: Element[][]): unknown[][] {
  const single = table.length === 1 && table[0]?.length === 1;
  for (const row of table as unknown[][]) {
    for (let c = 0; c < row.length; c++) {
      const element = row[c] as Element;
      if (typeof element === 'number') {
        if (element - element !== 0) row[c] = faultless(single);
      } else if (element instanceof CellFault) {
        row[c] = single ? thrown(element) : errorOf(element);
      }
    }
  }
  return table;
}

function thrown(fault: CellFault): never {
  throw fault;
}

function faultless(single: boolean): Error {
  const fault = new CellFault('#N/A', 'the equation has no finite value here');
  return single ? thrown(fault) : errorOf(fault);
}
