import { entries } from '../../core/catalogue/entries';
import { catalogue } from '../../core/catalogue/find';
import type { Registry } from '../../core/catalogue/registry';
import { EMPTY_HOUSE } from '../../core/house/house';
import { houseRegistry } from '../../core/house/houseRegistry';
import { Problem } from '../../core/problem';
import { houseStore, type HouseState } from './store';

let made: { readonly state: HouseState; readonly registry: Registry } | undefined;
let missed = false;

/** Built-in substances and the workbook's own as one registry: every function looks names up here. */
export function currentRegistry(): Registry {
  const state = houseStore.current();
  if (made === undefined || made.state !== state) made = { state, registry: registryOf(state) };
  return made.registry;
}

/**
 * Whether a name was asked for and not found before the workbook's own substances were read: then formulas have to be
 * calculated again. Asking forgets it.
 */
export function takeMissed(): boolean {
  const was = missed;
  missed = false;
  return was;
}

function registryOf(state: HouseState): Registry {
  switch (state.state) {
    case 'ready':
      return state.house === EMPTY_HOUSE ? catalogue : houseRegistry(entries, state.house);
    case 'absent':
      return catalogue;
    case 'unread':
      return saying((problem) => {
        missed = true;
        return `${problem.message}; the workbook's own substances are not read yet: recalculate`;
      });
    case 'broken':
      return saying(
        (problem) =>
          `${problem.message}; the name Latentry_substances leads to no cells (${state.text}), so that none of the workbook's own are known`,
      );
  }
}

/** The built-in substances; a name that is none of them may be one of the workbook, which can't be asked. */
function saying(words: (problem: Problem) => string): Registry {
  return {
    entries: catalogue.entries,
    entry: (text) => catalogue.entry(text),
    find(text) {
      if (catalogue.entry(text) !== undefined) return catalogue.find(text);
      try {
        return catalogue.find(text);
      } catch (thrown) {
        if (!(thrown instanceof Problem)) throw thrown;
        throw new Problem({ code: 'missing', subject: 'substance', reason: words(thrown).replace(/^substance: /, '') });
      }
    },
  };
}
