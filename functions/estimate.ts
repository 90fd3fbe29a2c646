import type { Answer } from '../core/answer';
import { Problem } from '../core/problem';
import { fromMolar } from '../core/units/fromMolar';
import { checkedMolarMass } from '../core/units/perMole';
import { answer } from './edge/answer';
import { shapeOf, type Block } from './edge/block';
import { CellFault, peel, shown } from './edge/cell';
import { faultOf } from './edge/cellError';
import { answerPart, showPart, statusOf } from './edge/evidence';
import type { BlockwiseSpec, Element, Table } from './edge/spec';
import { Inputs } from './estimating/inputs';
import { estimateBy } from './estimating/methods';
import type { Settings } from './settings/settings';

const spec: BlockwiseSpec = {
  family: 'blockwise',
  name: 'ESTIMATE',
  args: [
    { name: 'method', kind: 'key' },
    { name: 'inputs', kind: 'block' },
  ],
  options: [],
  run: ([methods, block], settings) => {
    if (methods?.columns !== 1) {
      throw new Problem({
        code: 'argument',
        argument: 'method',
        allowed: 'one method, or a column of them',
        received: methods === undefined ? 'nothing' : `a range of ${shapeOf(methods)}`,
      });
    }
    const blanks = methods.rows > 1;
    const rows = methods.cells.map(([method]) => row(method, blanks, block, settings));
    const only = rows.length === 1 ? rows[0]?.[0] : undefined;
    return only instanceof CellFault ? [[only]] : rows;
  },
};

/** Value and typical standard uncertainty of one method, or the part that `answer=` asks for. */
function row(raw: unknown, blanks: boolean, block: Block | undefined, settings: Settings): Table[number] {
  const asked = settings.options['answer'] === undefined ? undefined : answerPart(settings);
  try {
    const method = peel(raw);
    if (method instanceof CellFault) throw method;
    if (method === null && blanks) return asked === undefined ? ['', ''] : [''];
    if (typeof method !== 'string') {
      throw new Problem({ code: 'argument', argument: 'method', allowed: 'a text', received: shown(method) });
    }
    const inputs = new Inputs(block, settings);
    const estimate = estimateBy(method, inputs, settings);
    const scale = scaleOf(estimate, inputs, settings);
    const toCell = (si: number): number => si * scale;
    const plan = { compute: () => toCell(estimate.value), record: () => estimate, toCell };
    if (asked !== undefined) return [showPart(asked, plan, [], settings)];
    return [toCell(estimate.value), toCell(estimate.uncertainty ?? 0)];
  } catch (thrown) {
    const fault = faultOf(thrown, settings);
    const element: Element = asked === 'status' ? statusOf(fault) : fault;
    return asked === undefined ? [element, element] : [element];
  }
}

/** From the SI of the answer, per mole or per kilogram, to the workbook's unit. */
function scaleOf({ unit }: Answer, inputs: Inputs, settings: Settings): number {
  const cell = settings.units[unit.includes('K)') ? 'heatCapacity' : 'heat'];
  if (!unit.includes('kg')) return fromMolar(cell, inputs.molarMass).scale;
  const perKilogram = cell.basis === 'mass' ? 1 : checkedMolarMass(inputs.molarMass, `for ${cell.symbol}`);
  return perKilogram / cell.factor;
}

/**
 * An estimate from a few inputs, with its typical standard uncertainty beside it: a latent heat or a heat capacity.
 * @customfunction ESTIMATE
 * @requiresParameterAddresses
 * @param method watson, riedel, chen, vetere, trouton, kistiakowsky, acentric factor, vaporization heat capacity difference, sublimation heat capacity difference, kopp, hurst-harrison, neumann-kopp or composition.
 * @param inputs Two columns, names and values: "critical temperature" | "514 K". A row "substance" | "ethanol" fills what is missing.
 * @param [settings] Latentry_units, or text as "heat=kJ/mol" or "answer=method".
 * @param invocation The call itself.
 * @returns Value and typical standard uncertainty side by side, in the workbook's unit.
 */
export function estimate(
  method: any[][],
  inputs: any[][],
  settings?: any[][][],
  invocation?: CustomFunctions.Invocation,
): any[][] {
  return answer(spec, [method, inputs, settings, invocation]);
}
