import { readFile } from 'node:fs/promises';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { disagreementOf } from './disagreementOf.mjs';
import { fitFluid } from './fitFluid.mjs';
import { fluidOfRecord } from './fluidsOfRecords.mjs';
import { readPoints } from './readPoints.mjs';

const here = path.dirname(fileURLToPath(import.meta.url));

/** Their liquid and gas are species of the nine-coefficient data, and they are in the catalogue as elements. */
export const ELEMENTS = new Set(['mercury', 'iodine']);

export async function readRecords() {
  return JSON.parse(await readFile(path.join(here, 'records/fluids.json'), 'utf8'));
}

/** Every fluid of the records with its points and its fit. */
export async function fitAll(models) {
  const { fluids, sources } = await readRecords();
  const fitted = fluids
    .filter(({ name }) => !ELEMENTS.has(name))
    .map((record) => {
      const fluid = fluidOfRecord(models, record);
      const points = readPoints(models, record);
      const fit = fitFluid(models, fluid, points);
      return { record, fluid, points, fit, disagreement: disagreementOf(models, fluid, points, fit) };
    });
  return { fitted, sources };
}
