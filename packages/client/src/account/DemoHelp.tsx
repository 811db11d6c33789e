import { useMarket } from '../market/market.queries.ts';

/** Where the demo keeps its mails; nothing in production, where mails go to mailboxes. */
export function MailboxLink() {
  const { demo } = useMarket();
  if (!demo) return null;
  return (
    <p className="small mute">
      This is a demo: its mails are in <a href={demo.mailUrl}>the demo’s mailbox</a>.
    </p>
  );
}

const roleWords: Record<string, string> = {
  seller: 'Seller',
  buyer: 'Buyer',
  operator: 'Desk operator',
  assayer: 'Assay laboratory',
};

/** Who can be tried out in the demo. */
export function DemoSignIns({ onChoose }: { onChoose: (email: string) => void }) {
  const { demo } = useMarket();
  if (!demo || demo.signIns.length === 0) return null;
  return (
    <section aria-labelledby="demo-title" className="ruled-head mt-10">
      <h2 id="demo-title">Look around in the demo</h2>
      <p className="small mute">The password was printed when the demo started.</p>
      <table className="table">
        <thead>
          <tr>
            <th scope="col">Role</th>
            <th scope="col">E-mail</th>
            <th scope="col">
              <span className="sr-only">Choose</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {demo.signIns.map(({ role, email }) => (
            <tr key={email}>
              <td>{roleWords[role] ?? role}</td>
              <td className="break-all">{email}</td>
              <td className="text-right">
                <button type="button" className="link-button" onClick={() => onChoose(email)}>
                  Use<span className="sr-only"> {email}</span>
                </button>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      <div className="mt-4">
        <MailboxLink />
      </div>
    </section>
  );
}
