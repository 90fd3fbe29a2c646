import { useState } from 'react';
import type { CatalogueEntry } from '../../../core/substance';
import type { WorkbookHost } from '../../port';
import { Notice } from '../look/Notice';
import { useLook } from '../look/useLook';
import { settingsOf, useStore } from '../units/useUnits';
import { AddSubstance } from './add/AddSubstance';
import { CardBoundary } from './CardBoundary';
import { HouseNotice } from './HouseNotice';
import { SubstanceSearch } from './search/SubstanceSearch';
import { SubstanceCard } from './SubstanceCard';
import { useRegistry } from './useRegistry';

/** Every substance that formulas know, the team's own among them, with a card for the one that is chosen. */
export function SubstancesSection({ host }: { readonly host: WorkbookHost }) {
  const look = useLook();
  const store = useStore();
  const settings = settingsOf(store);
  const { registry, faults, state } = useRegistry();
  const [name, setName] = useState<string>();
  const chosen = registry.entries.find((entry) => entry.name === name);
  const choose = (entry: CatalogueEntry) => setName(entry.name);
  return (
    <div className={look.stack}>
      <h2 className={look.title}>Substances</h2>
      <HouseNotice state={state} faults={faults} />
      <SubstanceSearch entries={registry.entries} chosen={chosen} onChoose={choose} />
      {settings !== undefined && <AddSubstance host={host} decimal={settings.decimal} onShow={setName} />}
      {chosen !== undefined && settings === undefined && (
        <Notice tone="error">
          The unit settings of the workbook can’t be read. Repair them in the section Units first.
        </Notice>
      )}
      {chosen !== undefined && settings !== undefined && (
        <CardBoundary key={`${chosen.group} ${chosen.name}`} name={chosen.name}>
          <SubstanceCard host={host} entry={chosen} settings={settings} withoutUnits={store.state === 'absent'} />
        </CardBoundary>
      )}
    </div>
  );
}
