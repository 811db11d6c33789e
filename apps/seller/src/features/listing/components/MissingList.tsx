import { Link } from 'react-router-dom';

interface MissingListProps {
  items: readonly { message: string; page: string; to: string }[];
}

/** What stands between the draft and the market, each with the way to it. */
export function MissingList({ items }: MissingListProps) {
  return (
    <section id="missing" tabIndex={-1} className="mt-6" aria-labelledby="missing-title">
      <h2 id="missing-title">{items.length === 0 ? 'Nothing is missing' : 'Still missing'}</h2>
      {items.length > 0 && (
        <ul className="ruled ruled-head mt-2 pt-0!">
          {items.map(({ message, page, to }) => (
            <li key={to + message} className="flex flex-wrap justify-between gap-x-4">
              <Link to={to}>{message}</Link>
              <span className="small mute">{page}</span>
            </li>
          ))}
        </ul>
      )}
    </section>
  );
}
