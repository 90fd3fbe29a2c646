import { citedValues } from './citedValues.mjs';
import { leaveOneOut, majerHoldOut, waterHoldOut } from './holdOut.mjs';

const percent = (share) => `${(100 * share).toFixed(2)} %`;
const ROOM_K = 298.15;

/** A row a fluid (values, how many within k = 2, disagreement), every residual, and what the hold-outs give: markdown. */
export async function report(models, fitted) {
  const all = fitted.map((one) => ({ one, values: citedValues(models, one) }));
  const every = all.flatMap(({ values }) => values);
  const within = every.filter((value) => value.within).length;
  return [
    '# Fluids: what the fits give',
    '',
    `${every.length} cited values, ${percent(within / every.length)} within the stated expanded uncertainty (k = 2).`,
    '',
    '| fluid | class | values | within | disagreement 298.15 K to boiling, kJ/mol | its u |',
    '| --- | --- | ---: | ---: | ---: | ---: |',
    ...all.map(({ one, values }) => summary(one, values)),
    '',
    '| fluid | property | T / K | cited | source | fit − cited | 2u |',
    '| --- | --- | ---: | ---: | --- | ---: | ---: |',
    ...every.map(
      (v) =>
        `| ${v.name} | ${v.kind} | ${v.temperatureK.toFixed(2)} | ${Number(v.value.toPrecision(6))} | ${v.source} | ${percent(v.deviation)}${v.within ? '' : ' *'} | ${percent(2 * v.stated)} |`,
    ),
    '',
    ...(await holdOuts(models)),
    '',
  ].join('\n');
}

function summary({ fluid, disagreement }, values) {
  const within = values.filter((value) => value.within).length;
  const cells = [fluid.name, fluid.class, values.length, within, ...disagreementCells(fluid, disagreement)];
  return `| ${cells.join(' | ')} |`;
}

function disagreementCells({ criticalK, boilingK }, disagreement) {
  if (disagreement === undefined) return ['', ''];
  const [from, to, uncertainty, ...cubic] = disagreement;
  if (ROOM_K < from || ROOM_K > to) return ['out of range', ''];
  const at = (k) => cubic.reduceRight((sum, c) => sum * (k / criticalK) + c, 0);
  const share = Math.sqrt(Math.abs(boilingK - ROOM_K) / (to - from));
  return [((at(boilingK) - at(ROOM_K)) / 1000).toFixed(2), ((uncertainty * share) / 1000).toFixed(2)];
}

async function holdOuts(models) {
  const rows = [
    ['Majer and Svoboda left out, latent heat', await majerHoldOut(models)],
    ...['p', 'latent', 'cp'].map((kind) => [
      `water from few values, ${kind}`,
      waterHoldOut(models).filter((j) => j.kind === kind),
    ]),
    ...(await leaveOneOutRows(models)),
  ];
  return [
    '| held out | values | median | 95 % within | covered (k = 2) |',
    '| --- | ---: | ---: | ---: | ---: |',
    ...rows.map(([name, some]) => {
      const sizes = some.map(({ deviation }) => Math.abs(deviation)).sort((a, b) => a - b);
      const at = (share) => percent(sizes[Math.min(sizes.length - 1, Math.floor(share * sizes.length))]);
      const covered = some.filter(({ deviation, stated }) => Math.abs(deviation) <= 2 * stated).length / some.length;
      return `| ${name} | ${some.length} | ${at(0.5)} | ${at(0.95)} | ${percent(covered)} |`;
    }),
  ];
}

async function leaveOneOutRows(models) {
  const some = await leaveOneOut(models);
  return ['p', 'cp'].map((kind) => [`one left out, ${kind}`, some.filter((j) => j.kind === kind)]);
}
