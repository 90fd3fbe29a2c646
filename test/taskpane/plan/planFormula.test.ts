import { describe, expect, it } from 'vitest';
import { formulaText, type FormulaAt } from '../../../taskpane/plan/formulaText';
import { planFormula } from '../../../taskpane/plan/planFormula';
import { cellArgument, insertTarget } from '../../../taskpane/pane/substances/insert/insertTarget';
import { memoryHost } from '../memoryHost';

const at: FormulaAt = { temperature: 'A2', pressure: { value: 101.325, text: '101.325 kPa', usual: true } };
const cell = { sheet: 'Data', address: 'B2' };
const ask = { name: 'LATENT', arguments: [{ text: 'ethanol' }, { text: 'vaporization' }, 'temperature'] } as const;

describe('formulaText', () => {
  it('always passes the Units block', () => {
    expect(formulaText(ask, at)).toBe('=LATENTRY.LATENT("ethanol","vaporization",A2,Latentry_units)');
  });

  it('leaves the usual pressure out where it may be, and says it where it must be', () => {
    const capacity = {
      name: 'HEATCAP',
      arguments: [{ text: 'x' }, { text: 'gas' }, 'temperature', 'pressure', 'blank'],
    } as const;
    expect(formulaText(capacity, at)).toBe('=LATENTRY.HEATCAP("x","gas",A2,,,Latentry_units)');
    const high = { ...at, pressure: { value: 250, text: '250 kPa', usual: false } };
    expect(formulaText(capacity, high)).toBe('=LATENTRY.HEATCAP("x","gas",A2,250,,Latentry_units)');
    const boiling = { name: 'SATTEMPERATURE', arguments: [{ text: 'x' }, 'stated pressure'] } as const;
    expect(formulaText(boiling, at)).toBe('=LATENTRY.SATTEMPERATURE("x",101.325,Latentry_units)');
  });

  it('writes what unit conversion leaves of a number with twelve digits, and doubles quotes', () => {
    const odd = { ...at, temperature: 24.999999999999986 };
    expect(formulaText({ ...ask, arguments: [{ text: 'plant "A" brine' }, 'temperature'] }, odd)).toBe(
      '=LATENTRY.LATENT("plant ""A"" brine",25,Latentry_units)',
    );
  });
});

describe('planFormula', () => {
  it('is one cell; a workbook without units gets its Units sheet in the same step', () => {
    expect(planFormula({ cell, ask, at })).toEqual([
      { kind: 'cells', ref: cell, formulas: [[formulaText(ask, at)]], format: 'answer' },
    ]);
    const changes = planFormula({ cell, ask, at }, true);
    expect(changes[0]).toEqual({ kind: 'sheet', name: 'Units' });
    expect(changes.at(-1)).toMatchObject({ kind: 'cells', ref: cell });
    expect(changes.some((change) => change.kind === 'name' && change.name === 'Latentry_units')).toBe(true);
  });

  it('lets a host see that the cell is taken', async () => {
    const host = memoryHost();
    host.book.addSheet('Data');
    host.type(cell, [['mine']]);
    expect(await host.check(planFormula({ cell, ask, at }))).toMatchObject([{ reason: 'occupied' }]);
  });
});

describe('insertTarget', () => {
  it('is the first cell of the selection, or a refusal', () => {
    expect(insertTarget({ sheet: 'Data', address: 'B2:C9' })).toEqual(cell);
    expect(() => insertTarget(null)).toThrow('nothing is selected');
  });
});

describe('cellArgument', () => {
  it.each([
    ['a2', 'A2'],
    ['$A$2', '$A$2'],
    ['Data!A2', 'A2'],
    ["'Run 1'!C3", "'Run 1'!C3"],
  ])('reads %j as %j', (text, expected) => {
    expect(cellArgument(text, cell)).toBe(expected);
  });

  it.each(['A1:A3', 'soon', 'B2', 'Data!B2', ''])('refuses %j', (text) => {
    expect(() => cellArgument(text, cell)).toThrow('temperature in formulas: allowed');
  });
});
