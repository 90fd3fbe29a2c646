import { expect, it } from 'vitest';
import { fluidPage } from './fluidPage';

it('the page of residuals is what the catalogue gives', async () => {
  await expect(await fluidPage()).toMatchFileSnapshot('../../reference/fluid-residuals.md');
});
