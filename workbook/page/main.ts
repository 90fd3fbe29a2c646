import { standardBook } from '../standard/standardBook';
import { pageElements } from './bar/elements';
import { wordsOf } from './bar/notice';
import { startPage, type RunningPage } from './startPage';
import './page.css';

declare global {
  var LatentryPage: RunningPage | undefined;
}

const elements = pageElements();
startPage(elements, standardBook).then(
  (page) => {
    globalThis.LatentryPage = page;
  },
  (error: unknown) => {
    elements.loading.hidden = false;
    elements.loading.setAttribute('role', 'alert');
    elements.loading.textContent = `The workbook could not be started: ${wordsOf(error)}. Reload the page to try again.`;
    elements.status.textContent = 'Not started';
    throw error;
  },
);
