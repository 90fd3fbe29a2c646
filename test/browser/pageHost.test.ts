import { afterAll, beforeAll } from 'vitest';
import { describeHostContract } from '../taskpane/hostContract';
import { hearEvents, pageHarness } from './support/pageHarness';
import { type OpenedPage, type ServedPage, servedPage } from './support/servedPage';

let server: ServedPage;
let opened: OpenedPage;

beforeAll(async () => {
  server = await servedPage();
  opened = await server.open();
  await hearEvents(opened.page);
});
afterAll(() => server.close());

describeHostContract('the grid of the local page', () => pageHarness(opened.page));
