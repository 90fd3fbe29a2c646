import { shortNumber } from '../../problem';
import { latentCurve } from './latentCurves';
import type { CondensedModel } from './model';
import { boilingK } from './uncertainty';

/** From this difference on the note on other published values says so first. */
const FAR_PART = 0.05;

/** What a reader should know at once, the record's own notes first. */
export function condensedNotes(model: CondensedModel): readonly string[] {
  const { record } = model;
  const own = record.notes ?? [];
  const heats = Object.entries(record.published ?? {}).map(([change, published]) => {
    const value = latentCurve(model, change, 'isobaric', 'latent').at(transitionK(model, change)) / 1000;
    const far = published.some(([other]) => Math.abs(other - value) > FAR_PART * value);
    const others = published.map(([other, source]) => `${other} (${source})`).join(', ');
    const head = far ? 'Published values differ much' : 'Other published values';
    return `${head}: ${change} ${shortNumber(value)} kJ/mol here, ${others}.`;
  });
  const boiling = boilingK(model);
  const printed = record.vapour?.boils;
  const boils =
    boiling === undefined || printed === undefined
      ? []
      : [
          `Boiling temperature computed from these data ${boiling.toFixed(1)} K; published ${printed[0]} K (${printed[1]}).`,
        ];
  const lacking = record.vapour?.lacking === undefined ? [] : [`Real vapour not given: ${record.vapour.lacking}.`];
  const end = record.end === undefined ? [] : [`Data end at ${record.end.kelvin} K: ${record.end.why}.`];
  return [...own, ...heats, ...boils, ...lacking, ...end];
}

export function transitionK({ forms }: CondensedModel, change: string): number {
  return forms.find(({ changeAbove }) => changeAbove === change)?.toK ?? NaN;
}
