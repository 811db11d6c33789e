import { Button, Notice } from '@lydite/ui';
import { useDraft } from '../draft-context.tsx';
import { differencesOf } from '../draft-differences.ts';

/** Why the draft is not saved, above the form, and what to do about it. Nothing entered is lost meanwhile. */
export function SaveTrouble({ currency }: { currency: string }) {
  const { state, message, problems, isKeptHere } = useDraft();
  if (state === 'conflict') return <VersionChoice currency={currency} />;
  if (state === 'offline') {
    return (
      <div className="mb-5">
        <Notice live title="Not saved yet.">
          {isKeptHere ? 'Your changes are kept on this device and sent by themselves.' : message} You can carry on.
        </Notice>
      </div>
    );
  }
  if (state !== 'refused') return null;
  return (
    <div className="mb-5">
      <Notice tone="danger" live title="The draft could not be saved.">
        {message}
        {problems.length > 0 && (
          <ul className="mt-1">
            {problems.map(({ path, message: what }) => (
              <li key={path}>
                <a href={`#${path}`}>{what}</a>
              </li>
            ))}
          </ul>
        )}
      </Notice>
    </div>
  );
}

/** Two versions of one draft, side by side: the seller says which stands. */
function VersionChoice({ currency }: { currency: string }) {
  const { draft, other, keepMine, takeOther } = useDraft();
  if (!other) return null;
  return (
    <section className="mb-7" aria-labelledby="versions">
      <Notice tone="warn" live>
        <h2 id="versions">This draft was saved elsewhere meanwhile</h2>
        <p>Nothing was overwritten. Choose which version stands.</p>
        <table className="table">
          <thead>
            <tr>
              <th scope="col">Differs in</th>
              <th scope="col">Here</th>
              <th scope="col">Saved elsewhere</th>
            </tr>
          </thead>
          <tbody>
            {differencesOf(draft, other.draft, currency).map(({ name, mine, other: theirs }) => (
              <tr key={name}>
                <th scope="row">{name}</th>
                <td>{mine}</td>
                <td>{theirs}</td>
              </tr>
            ))}
          </tbody>
        </table>
        <div className="notice-actions">
          <Button onClick={() => void keepMine()}>Keep mine</Button>
          <Button look="quiet" onClick={() => void takeOther()}>
            Take the other
          </Button>
        </div>
      </Notice>
    </section>
  );
}
