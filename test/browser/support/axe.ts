import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import type { Page } from 'playwright-core';

const script = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

interface Axe {
  run(
    context: { exclude: string[][] },
    options: object,
  ): Promise<{ violations: { id: string; nodes: { html: string; failureSummary?: string }[] }[] }>;
}

/** The faults of the page's own DOM; the grid library draws what stands in its container. */
export default async function ownFaults(page: Page): Promise<string[]> {
  const loaded = await page.evaluate(() => 'axe' in globalThis);
  // Evaluated from outside: the page's own policy lets no foreign script in.
  if (!loaded) await page.evaluate(script);
  return page.evaluate(async () => {
    const { axe } = globalThis as unknown as { axe: Axe };
    const tags = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'];
    const context = { exclude: [['#grid'], ['[id^="univer"]']] };
    const { violations } = await axe.run(context, { runOnly: tags, resultTypes: ['violations'] });
    return violations.flatMap(({ id, nodes }) =>
      nodes.map(({ html, failureSummary }) => `${id}: ${html} ${failureSummary ?? ''}`),
    );
  });
}
