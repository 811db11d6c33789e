import type { DealView } from '@lydite/contracts';
import { Page } from '@lydite/ui';
import { Link } from 'react-router-dom';
import { stateWords } from './deal-headline.ts';

/** Shown at the address of a step that the deal does not offer, or no longer. */
export function NotNow({ deal }: { deal: Pick<DealView, 'code' | 'state'> }) {
  return (
    <Page shape="narrow">
      <h1>This can’t be done now</h1>
      <p className="say mt-4">The deal stands at: {stateWords[deal.state].toLowerCase()}.</p>
      <p className="actions">
        <Link to={`/deals/${deal.code}`}>Go to the deal</Link>
      </p>
    </Page>
  );
}
