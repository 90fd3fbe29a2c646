import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { expect, it } from 'vitest';

it('the committed numbers are what the generator fits to the cited values', () => {
  const script = fileURLToPath(new URL('../../../core/catalogue/generate/generateCatalogue.mjs', import.meta.url));
  const { status, stdout, stderr } = spawnSync(process.execPath, [script, '--check'], { encoding: 'utf8' });
  expect(stderr).toBe('');
  expect(stdout).toBe('fluids.generated.ts is up to date\n');
  expect(status).toBe(0);
}, 60_000);
