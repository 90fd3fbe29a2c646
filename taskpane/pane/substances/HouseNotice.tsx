import type { HouseFault } from '../../../core/house/house';
import type { HouseState } from '../../../functions/house/store';
import { Notice } from '../look/Notice';
import { useLook } from '../look/useLook';

/** Rows of the Substances sheet that can't be read, each with its message. */
export function HouseNotice({ state, faults }: { readonly state: HouseState; readonly faults: readonly HouseFault[] }) {
  const look = useLook();
  if (state.state === 'broken') {
    return (
      <Notice tone="error">
        The name Latentry_substances leads to no cells ({state.text}), so that none of the workbook’s own substances are
        known: point it at their rows again.
      </Notice>
    );
  }
  if (faults.length === 0) return null;
  const errors = faults.filter(({ severity }) => severity === 'error').length;
  return (
    <Notice tone="caution">
      <span>
        {errors === 0
          ? 'Rows of the Substances sheet that need a second look:'
          : `Rows of the Substances sheet that can’t be used: ${errors}. Everything else works.`}
      </span>
      <ul className={look.list}>
        {faults.map(({ row, column, message }) => (
          <li key={`${row} ${column} ${message}`}>{message}</li>
        ))}
      </ul>
    </Notice>
  );
}
