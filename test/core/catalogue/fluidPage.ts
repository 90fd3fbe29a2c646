import { readFileSync } from 'node:fs';
import { format } from 'prettier';
import { catalogue } from '../../../core/catalogue/find';
import { Problem } from '../../../core/problem';
import type { Curve, Substance } from '../../../core/substance';
import { judge, quantile, unseen, type Judged } from './fluidReference';
import { AIMS } from './fluidAims';
import { ask, ATMOSPHERE } from './tour';

interface Point {
  readonly value?: number;
  readonly p_kPa?: number;
  readonly T_K?: number;
  readonly source: string;
  readonly detail?: string;
  readonly note?: string;
  readonly confirmed?: boolean;
  readonly rejected?: string;
}

interface FluidRecord {
  readonly name: string;
  readonly Tb: Point & { readonly value: number };
  readonly vapour_pressure_points: readonly Point[];
  readonly dHvap_points: readonly Point[];
  readonly Cp_liquid: { readonly values: readonly Point[] };
  readonly check_values: Readonly<Record<string, readonly Point[] | undefined>>;
}

const records = JSON.parse(
  readFileSync(new URL('../../../core/catalogue/generate/records/fluids.json', import.meta.url), 'utf8'),
) as { sources: Readonly<Record<string, string>>; fluids: readonly FluidRecord[] };

const percent = (share: number): string => `${(100 * share).toFixed(2)} %`;
const digits = (value: number): string => String(Number(value.toPrecision(5)));

/** One line: what, temperature, printed value, source, the catalogue's value, difference, stated uncertainty (k = 2). */
function line(what: string, point: Point, at: number, unit: string, factor: number, curve: Curve | Problem): string {
  const printed = point.p_kPa ?? point.value ?? NaN;
  // Pressures are boiling temperatures at round pressures, computed from the equation of their source: said once, above.
  const detail = point.p_kPa === undefined ? point.detail : undefined;
  const origin = [point.source, detail, point.note, point.confirmed === false ? 'unconfirmed' : undefined]
    .filter((text) => text !== undefined)
    .join('; ');
  const start = [what, digits(at), `${printed} ${unit}`, point.rejected === undefined ? origin : `${origin}; rejected`];
  if (curve instanceof Problem || at < curve.from || at > curve.to) return row([...start, '–', '–', '–']);
  const value = curve.at(at) / factor;
  const stated = curve.uncertaintyAt?.(at);
  return row([
    ...start,
    digits(value),
    percent(value / printed - 1),
    stated === undefined ? '–' : percent((2 * stated) / factor / value),
  ]);
}

const row = (cells: readonly string[]): string => `| ${cells.join(' | ')} |`;
const HEAD = [
  row(['value', 'T, K', 'printed', 'source', 'catalogue', 'difference', 'stated (k = 2)']),
  row(['---', '--:', '--:', '---', '--:', '--:', '--:']),
];

function linesOf(substance: Substance, record: FluidRecord): string[] {
  const real = ask(() => substance.latent('vaporization', 'coexistence'));
  const ideal = ask(() => substance.latent('vaporization', 'standard'));
  const pressure = ask(() => substance.saturationPressure('stable'));
  const liquid = ask(() => substance.heatCapacity('liquid', 'saturated'));
  const fusion = ask(() => substance.latent('fusion', 'isobaric'));
  const melting = substance.transitionTemperature('fusion') ?? NaN;
  const boiling = record.Tb.value;
  const { dHvap_at_Tb, dHvap_298_15, dHvap_other_T, dHfus_at_Tm } = record.check_values;
  const latents = [
    ...record.dHvap_points.map((p) => [p, p.T_K ?? NaN] as const),
    ...(dHvap_at_Tb ?? []).map((p) => [p, p.T_K ?? boiling] as const),
    ...(dHvap_298_15 ?? []).map((p) => [p, 298.15] as const),
    ...(dHvap_other_T ?? []).map((p) => [p, p.T_K ?? NaN] as const),
  ].sort((a, b) => a[1] - b[1]);
  return [
    ...record.vapour_pressure_points.map((p) => line('p', p, p.T_K ?? NaN, 'kPa', 1000, pressure)),
    ...latents.map(([p, at]) =>
      line('ΔHvap', p, at, 'kJ/mol', 1000, /standard|ideal/.test(p.note ?? '') ? ideal : real),
    ),
    ...(dHfus_at_Tm ?? []).map((p) => line('ΔHfus', p, melting, 'kJ/mol', 1000, fusion)),
    ...record.Cp_liquid.values.map((p) => line('cp, liquid', p, p.T_K ?? NaN, 'J/(mol K)', 1, liquid)),
  ];
}

function disagreementOf(substance: Substance, record: FluidRecord): string {
  const answer = ask(() => substance.disagreement('vaporization', 298.15, record.Tb.value));
  if (answer instanceof Problem) return `Disagreement: ${answer.message}.`;
  const latent = ask(() => substance.latent('vaporization', 'coexistence').at(record.Tb.value));
  const share = latent instanceof Problem ? '' : ` (${percent(Math.abs(answer.value) / latent)} of it)`;
  return `Heat of vaporization and heat capacities disagree by ${digits(answer.value)} J/mol between 298.15 K and ${record.Tb.value} K${share}.`;
}

function unseenLines(judged: readonly Judged[]): string[] {
  return judged.map(({ at, deviation, stated }) =>
    row([
      { dHvap: 'ΔHvap', p_sat: 'p', cp_liquid: 'cp, liquid' }[at.quantity],
      digits(at.T_K),
      `${at.value} ${at.unit}`,
      `${at.source}; ${at.status === 'page' ? 'read' : 'from memory'}`,
      '',
      percent(deviation),
      percent(2 * stated),
    ]),
  );
}

function summary(judged: readonly Judged[]): string[] {
  return [
    row(['aim', 'values', 'fluids', 'median', '95 % within', 'largest', 'covered by the stated uncertainty (k = 2)']),
    row(['---', '--:', '--:', '--:', '--:', '--:', '--:']),
    ...AIMS.map(({ name, of, median, most }) => {
      const some = judged.filter(of);
      const sizes = some.map(({ deviation }) => Math.abs(deviation));
      const covered = some.filter(({ deviation, stated }) => Math.abs(deviation) <= 2 * stated).length;
      return row([
        name,
        String(some.length),
        String(new Set(some.map(({ at }) => at.fluid)).size),
        `${percent(quantile(sizes, 0.5))} (aim ${percent(median)})`,
        `${percent(quantile(sizes, 0.95))} (aim ${percent(most)})`,
        percent(Math.max(...sizes)),
        percent(covered / some.length),
      ]);
    }),
  ];
}

/** The page for people: every cited value of every fluid beside what the catalogue gives, then what no fit has seen. */
export async function fluidPage(): Promise<string> {
  const judged = unseen.values.map(judge).filter((one) => one !== undefined);
  const fluids = records.fluids.flatMap((record) => {
    const substance = catalogue.entry(record.name)?.make();
    if (substance === undefined) throw new Error(`no such fluid: ${record.name}`);
    const own = judged.filter(({ at }) => at.fluid === record.name);
    return [
      `## ${record.name}`,
      '',
      disagreementOf(substance, record),
      '',
      ...HEAD,
      ...linesOf(substance, record),
      ...unseenLines(own).map((text, i) =>
        i === 0 ? `${row(['**unseen**', '', '', '', '', '', ''])}\n${text}` : text,
      ),
      '',
    ];
  });
  const text = [
    '# Fluids: what is printed and what the catalogue gives',
    '',
    'Written by test/core/catalogue/fluidPage.ts; `npx vitest run --project unit test/core/catalogue/fluidPage.test.ts -u` writes it anew.',
    '',
    `Difference: catalogue less printed value, relative. Uncertainty: expanded, k = 2. Melting at ${ATMOSPHERE / 1000} kPa. Sources by their keys in core/catalogue/generate/records/fluids.json and test/reference/fluid-unseen.json; pressures of pgl-D and webbook are boiling temperatures at round pressures, computed from their equations. Values under "unseen" judge the fits and are in none of them.`,
    '',
    ...summary(judged),
    '',
    ...fluids,
  ].join('\n');
  return format(text, { parser: 'markdown', printWidth: 120 });
}
