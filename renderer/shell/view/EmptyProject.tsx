import type { JSX } from 'react';
import type { RecipeKind } from '../../../core/project/model.ts';
import { BayKindThumbnail } from '../../panels/bays/BayThumbnail.tsx';
import { addBay } from '../commands/bayCommands.ts';
import { useServices } from '../services.tsx';

const OFFERS: readonly { readonly kind: RecipeKind; readonly label: string; readonly says: string }[] = [
  { kind: 'wall', label: 'Wall bay', says: 'tiers between two columns' },
  { kind: 'roof', label: 'Roof bay', says: 'panels between two rafters, under purlins' },
  { kind: 'knee', label: 'Knees', says: 'from a chord or flange up to purlins' },
  { kind: 'free', label: 'Free bay', says: 'nodes and bars given one by one' },
];

/** What to do with a project that has no bays yet. */
export function EmptyProject(): JSX.Element {
  const services = useServices();
  return (
    <div className="empty">
      <h2>Nothing is set out yet</h2>
      <p className="second">Begin with a bay; its width, tiers, pattern and section follow in the recipe.</p>
      <ul className="empty-offers">
        {OFFERS.map(({ kind, label, says }) => (
          <li key={kind}>
            <button type="button" className="empty-offer" onClick={() => addBay(services, kind)}>
              <BayKindThumbnail kind={kind} />
              <span>
                <b>{label}</b>
                <span className="second">{says}</span>
              </span>
            </button>
          </li>
        ))}
      </ul>
      <p>
        Or{' '}
        <button type="button" className="button" onClick={() => void services.documents.open()}>
          Open a project…
        </button>
      </p>
    </div>
  );
}
