import { announce, useMarket, useTitle } from '@lydite/client';
import { useRequestForm } from '@lydite/client/form';
import { buyingTerms, type BuyingTerms } from '@lydite/contracts';
import { buttonClass, Notice, Page, PageHead } from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import { AssumedTerms } from '../features/terms/components/AssumedTerms.tsx';
import { TermsForm } from '../features/terms/components/TermsForm.tsx';
import { termsQuery, useKeepTerms } from '../features/terms/terms.queries.ts';

/** A buyer's own terms: what every highest safe bid is worked out from. */
export function Component() {
  useTitle('My terms');
  const { currency } = useMarket();
  const { data: terms } = useSuspenseQuery(termsQuery);
  const keep = useKeepTerms();
  const [isKept, setKept] = useState(false);
  const request = useRequestForm<BuyingTerms>({
    schema: buyingTerms,
    start: terms,
    send: async (values) => {
      setKept(false);
      await keep.mutateAsync(values);
      setKept(true);
      announce('Your terms are kept.', { own: true });
    },
  });
  return (
    <Page>
      <PageHead
        title="My terms"
        facts={['What every highest safe bid is worked out from. Sellers and other buyers never see them.']}
      />
      <div className="terms">
        <div>
          <TermsForm {...request} currency={currency} />
          {isKept && <Kept />}
        </div>
        <AssumedTerms />
      </div>
    </Page>
  );
}

function Kept() {
  const lotCode = useSearchParams()[0].get('lot');
  return (
    <div className="mt-4">
      <Notice tone="ok" title="Kept.">
        Every lot is valued by these terms from now on.
      </Notice>
      <p className="actions mt-3">
        <Link className={buttonClass()} to={lotCode ? `/lots/${encodeURIComponent(lotCode)}` : '/'}>
          {lotCode ? `Back to lot ${lotCode}` : 'See the lots'}
        </Link>
      </p>
    </div>
  );
}
