/**
 * Writes `core/nasa9/species.generated.ts` from the transcribed data set in `species.json`: one packed text a species.
 * Run with `--check` to compare with the committed file instead of writing it.
 */
import { readFile, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { fileURLToPath } from 'node:url';

const here = path.dirname(fileURLToPath(import.meta.url));
const target = path.resolve(here, '../species.generated.ts');

/** Molecules of three and more atoms on a line: their rotation holds R, not 3/2 R. */
const LINEAR = new Set(['CO2']);

function kindOf({ name, phase, elements }) {
  if (phase !== 'gas') return phase;
  const atoms = Object.values(elements).reduce((sum, count) => sum + count, 0);
  if (atoms === 1) return 'atom';
  return atoms === 2 || LINEAR.has(name) ? 'linear' : 'bent';
}

/** What the comment says besides the source is known from elsewhere, or of no use to a reader. */
function shortComment(comment) {
  return comment
    .replace(/Ref-Elm\.\s*/g, '')
    .replace(/\s+/g, ' ')
    .trim();
}

/** Entries that are one form under two names, split where nothing happens. */
const ONE_FORM = new Map([['KOH(a)', 'KOH(b)']]);

/** Parts of one form, split at a second-order point, become one species. */
function joined(species) {
  const byName = new Map();
  for (const part of species) {
    const name = ONE_FORM.get(part.name) ?? part.name;
    const known = byName.get(name);
    if (known === undefined) byName.set(name, { ...part, name, intervals: [...part.intervals] });
    else known.intervals.push(...part.intervals);
  }
  return [...byName.values()];
}

function packed(species) {
  const rows = species.intervals.map((row) => [...row]);
  const release = species.reportFromK === undefined ? '' : rows[0][0];
  if (species.reportFromK !== undefined) rows[0][0] = species.reportFromK;
  rows.forEach((row, i) => {
    if (row.length !== 11 || row.some((x) => typeof x !== 'number')) throw new Error(`${species.name}: a bad row`);
    if (!(row[0] < row[1])) throw new Error(`${species.name}: limits ${row[0]} and ${row[1]}`);
    if (i > 0 && row[0] !== rows[i - 1][1]) throw new Error(`${species.name}: intervals do not meet at ${row[0]}`);
  });
  const head = [kindOf(species), species.gramsPerMole, release, shortComment(species.comment)].join(';');
  return [head, ...rows.map((row) => row.map(shortest).join(','))].join('\n');
}

/** The shortest text of the same double. */
function shortest(x) {
  const plain = String(x);
  const scientific = x.toExponential().replace('e+', 'e');
  return (scientific.length < plain.length ? scientific : plain).replace(/^(-?)0\./, '$1.');
}

const { species } = JSON.parse(await readFile(path.join(here, 'species.json'), 'utf8'));
const lines = joined(species).map((one) => `  ${JSON.stringify(one.name)}: ${JSON.stringify(packed(one))},`);
const text = [
  '// Written by core/nasa9/generate/generateNasa9.mjs from species.json there. Do not edit.',
  '// NASA/TP-2002-211556, data release of 9 September 2021.',
  '/** Kind; g/mol; lower limit of the release where it differs; comment. Then a line an interval: from, to, a1-a7, b1, b2. */',
  'export const packedSpecies: Readonly<Record<string, string>> = {',
  ...lines,
  '};',
  '',
].join('\n');

if (process.argv.includes('--check')) {
  if ((await readFile(target, 'utf8')) !== text) {
    console.error('core/nasa9/species.generated.ts differs from what species.json gives');
    process.exitCode = 1;
  }
} else {
  await writeFile(target, text);
}
