import { describe, expect, it } from 'vitest';
import { HOUSE_HEADS } from '../../../core/house/houseRow';
import { readHouse } from '../../../core/house/readHouse';
import { parseArea } from '../../../taskpane/hosts/address';
import { planSubstanceRow, type SubstanceRow } from '../../../taskpane/plan/planSubstance';
import type { Block, Cell } from '../../../taskpane/port';
import { memoryHost, type MemoryHost } from '../memoryHost';

const melting: SubstanceRow = {
  substance: 'kelp wax',
  property: 'melting temperature',
  coefficients: 58,
  unit: 'degC',
  source: 'laboratory',
};
const fusion: SubstanceRow = {
  ...melting,
  property: 'heat of fusion',
  coefficients: 180,
  unit: 'kJ/kg',
  revision: 'B',
};

async function namedBlock(host: MemoryHost): Promise<Block> {
  const ref = (await host.names('Latentry_substances')).get('Latentry_substances');
  if (ref === undefined || ref === 'broken') throw new Error('the name leads nowhere');
  const [block] = await host.read([ref]);
  if (block === undefined) throw new Error('no block');
  return block;
}

function namesIn(block: Block): readonly string[] {
  const firstRow = (parseArea(block.ref.address)?.top ?? 0) + 1;
  const house = readHouse(block.values, { decimal: '.', firstRow, builtIn: [] });
  expect(house.faults).toEqual([]);
  return house.entries.map(({ name }) => name);
}

const block = (address: string, values: Cell[][]): Block => ({
  ref: { sheet: 'Substances', address },
  values,
  formulas: values.map((row) => row.map(() => '')),
});

describe('planSubstanceRow', () => {
  it('makes sheet, header, block and name where there are none, and the rows read back', async () => {
    const host = memoryHost();
    await host.apply(planSubstanceRow(undefined, [melting, fusion]), 'substance');
    const made = await namedBlock(host);
    expect(made.values[0]).toEqual(HOUSE_HEADS);
    expect(made.values).toHaveLength(51);
    expect(namesIn(made)).toEqual(['kelp wax']);
  });

  it('adds below the last row that is not blank, within the block', async () => {
    const host = memoryHost();
    await host.apply(planSubstanceRow(undefined, [melting]), 'substance');
    const before = await namedBlock(host);
    const changes = planSubstanceRow(before, [fusion]);
    expect(changes).toHaveLength(1);
    await host.apply(changes, 'substance');
    const after = await namedBlock(host);
    expect(after.values[2]?.slice(0, 4)).toEqual(['kelp wax', 'heat of fusion', null, 180]);
    expect(after.values).toHaveLength(before.values.length);
    expect(namesIn(after)).toEqual(['kelp wax']);
  });

  it('lets the block grow where it is full', () => {
    const full = block('B2:J3', [[...HOUSE_HEADS], ['brine', ...new Array<Cell>(8).fill(null)]]);
    expect(planSubstanceRow(full, [melting, fusion])).toMatchObject([
      { kind: 'cells', ref: { sheet: 'Substances', address: 'B4:J5' } },
      { kind: 'name', name: 'Latentry_substances', ref: { sheet: 'Substances', address: 'B2:J5' } },
    ]);
  });

  it('follows the order of the header that it finds, and leaves cells of other columns blank', () => {
    const head = ['Property', 'Substance', 'Remark', 'Unit', 'Value'];
    const [change] = planSubstanceRow(block('A1:E2', [head, new Array<Cell>(5).fill(null)]), [melting]);
    expect(change).toMatchObject({ values: [['melting temperature', 'kelp wax', null, 'degC', 58]] });
  });

  it('does not write over a cell that holds a formula with an empty value', () => {
    const values = [[...HOUSE_HEADS], new Array<Cell>(9).fill(null), new Array<Cell>(9).fill(null)];
    const formulas = values.map((row, r) => row.map((_, c) => (r === 1 && c === 0 ? '=IF(TRUE,"")' : '')));
    const [change] = planSubstanceRow({ ref: { sheet: 'Substances', address: 'A1:I3' }, values, formulas }, [melting]);
    expect(change).toMatchObject({ ref: { address: 'A3:I3' } });
  });

  it('plans nothing for no rows', () => {
    expect(planSubstanceRow(undefined, [])).toEqual([]);
  });
});
