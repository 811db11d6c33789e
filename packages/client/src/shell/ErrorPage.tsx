import { Page } from '@lydite/ui';
import { isRouteErrorResponse, Link, useRouteError } from 'react-router-dom';
import { isApiError } from '../call/api-error.ts';
import { useTitle } from './use-title.ts';

/** What a page shows that could not be shown. */
export function ErrorPage() {
  const error = useRouteError();
  // A page sends nothing but its address to be shown: what the market cannot read there leads nowhere either.
  if (isApiError(error) && (error.status === 404 || error.code === 'request.invalid')) return <NotFoundPage />;
  if (isRouteErrorResponse(error) && error.status === 404) return <NotFoundPage />;
  if (isApiError(error, 'session.totp_missing')) return <SecondStepMissingPage />;
  return <FailedPage error={error} />;
}

function FailedPage({ error }: { error: unknown }) {
  useTitle('Something went wrong');
  const known = isApiError(error);
  return (
    <Page shape="narrow">
      <h1>{known && error.code === 'network' ? 'The market cannot be reached' : 'Something went wrong'}</h1>
      <p className="mt-4">{known ? error.message : 'This page could not be shown. Nothing you entered was lost.'}</p>
      <p className="actions">
        <button type="button" className="btn" onClick={() => location.reload()}>
          Try again
        </button>
      </p>
    </Page>
  );
}

/** What operators meet first where the market wants a second step of them. */
function SecondStepMissingPage() {
  useTitle('Second step missing');
  return (
    <Page shape="narrow">
      <h1>Set up the second step first</h1>
      <p className="mt-4">
        The desk opens to those who sign in with a code of an authenticator app besides the password.
      </p>
      <p className="actions">
        <Link to="/account" className="btn btn-primary">
          Go to your account
        </Link>
      </p>
    </Page>
  );
}

export function NotFoundPage() {
  useTitle('Not found');
  return (
    <Page shape="narrow">
      <h1>There is nothing at this address</h1>
      <p className="mt-4">
        It may have been removed, or it belongs to somebody else. <Link to="/">Go to the start</Link>
      </p>
    </Page>
  );
}
