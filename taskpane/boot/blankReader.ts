import { setBlankReader, type BlankReader } from '../../functions/edge/blanks';
import { formatArea, parseArea, parseReference, type Area } from '../hosts/address';
import type { Block, Ref, WorkbookHost } from '../port';

/** Many single cells of a column are read as the one area around them, up to this size. */
const LARGEST_COVER = 100_000;
const MANY = 40;

type Blanks = readonly (readonly boolean[])[];

interface Asked {
  readonly ref: Ref;
  readonly area: Area;
}

function cover(areas: readonly Area[]): Area {
  const top = Math.min(...areas.map((area) => area.top));
  const left = Math.min(...areas.map((area) => area.left));
  return {
    top,
    left,
    rows: Math.max(...areas.map((area) => area.top + area.rows)) - top,
    columns: Math.max(...areas.map((area) => area.left + area.columns)) - left,
  };
}

/** What to read so that every asked area lies in one block. */
function plan(asked: readonly Asked[]): Ref[] {
  const sheets = new Map<string, Asked[]>();
  for (const one of asked) {
    const sheet = one.ref.sheet.toLowerCase();
    sheets.set(sheet, [...(sheets.get(sheet) ?? []), one]);
  }
  return [...sheets.values()].flatMap((ones) => {
    const whole = cover(ones.map(({ area }) => area));
    const first = ones[0];
    const together = ones.length > MANY && whole.rows * whole.columns <= LARGEST_COVER;
    return together && first !== undefined
      ? [{ sheet: first.ref.sheet, address: formatArea(whole) }]
      : ones.map(({ ref }) => ref);
  });
}

function blanksOf({ ref, area }: Asked, blocks: readonly Block[]): Blanks {
  for (const block of blocks) {
    const outer = parseArea(block.ref.address);
    if (outer === null || block.ref.sheet.toLowerCase() !== ref.sheet.toLowerCase()) continue;
    const r0 = area.top - outer.top;
    const c0 = area.left - outer.left;
    if (r0 < 0 || c0 < 0 || r0 + area.rows > outer.rows || c0 + area.columns > outer.columns) continue;
    return Array.from({ length: area.rows }, (_, r) =>
      Array.from({ length: area.columns }, (__, c) => {
        const value = block.values[r0 + r]?.[c0 + c];
        return value === null && block.formulas[r0 + r]?.[c0 + c] === '';
      }),
    );
  }
  return [];
}

/**
 * Lets functions ask which cells are truly empty, for hosts that hand blanks over as 0. All that ask in one
 * burst of calculation share one reading; nothing is kept after it, so an answer is never older than its burst.
 * A reference that is no plain area (another workbook, whole columns) gets `[]`: nothing is known to be empty.
 */
export function startBlankReader(host: WorkbookHost): () => void {
  let burst: Map<string, Asked> | undefined;
  let reading: Promise<Block[]> | undefined;

  const read: BlankReader = async (address) => {
    const ref = parseReference(address);
    const area = ref === null ? null : parseArea(ref.address);
    if (ref === null || area === null) return [];
    if (burst === undefined || reading === undefined) {
      const gathered = new Map<string, Asked>();
      burst = gathered;
      reading = new Promise<void>((resolve) => setTimeout(resolve, 0)).then(() => {
        burst = undefined;
        reading = undefined;
        return host.read(plan([...gathered.values()]));
      });
    }
    const asked = { ref, area };
    burst.set(`${ref.sheet.toLowerCase()}!${ref.address}`, asked);
    return blanksOf(asked, await reading);
  };

  setBlankReader(read);
  return () => {
    setBlankReader(undefined);
  };
}
