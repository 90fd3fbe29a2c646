import { benchCatalogue } from './benchCatalogue';
import { benchCore } from './benchCore';
import { benchFit } from './benchFit';
import { benchFunctions } from './benchFunctions';
import { benchGrid } from './benchGrid';
import { benchPage } from './benchPage';
import { benchSizes } from './benchSizes';

const PARTS: Readonly<Record<string, () => void | Promise<void>>> = {
  core: benchCore,
  functions: benchFunctions,
  catalogue: benchCatalogue,
  fit: benchFit,
  sizes: benchSizes,
  grid: benchGrid,
  page: benchPage,
};

/** Runs the named parts, or all of them. Ratios hold within one run; absolute times depend on the machine. */
export async function bench(names: readonly string[]): Promise<void> {
  for (const name of names.length === 0 ? Object.keys(PARTS) : names) {
    const part = PARTS[name];
    if (part === undefined) throw new Error(`no part ${name}; allowed ${Object.keys(PARTS).join(', ')}`);
    await part();
  }
}
