import type { LedgerReport } from '@lydite/contracts';

/** Every check with what it found; what fails stands out by its word. */
export function ChecksTable({ checks }: { checks: LedgerReport['checks'] }) {
  return (
    <div className="table-scroll relative" role="region" aria-label="Checks, table" tabIndex={0}>
      <table className="table table-dense min-w-0!">
        <caption className="sr-only">Checks</caption>
        <thead>
          <tr>
            <th scope="col">Check</th>
            <th scope="col">Result</th>
            <th scope="col">Found</th>
          </tr>
        </thead>
        <tbody>
          {checks.map(({ name, ok, detail }) => (
            <tr key={name}>
              <th scope="row">{name}</th>
              <td>{ok ? 'Holds' : <b className="bad">Fails</b>}</td>
              <td>{detail}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
