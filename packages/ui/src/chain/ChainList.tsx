import type { ChainStep } from './chain-types.ts';

const edge = 'H20A1.25 1.25 0 0 1 21.25 2v9A1.25 1.25 0 0 1 20 12.25H2A1.25 1.25 0 0 1 .75 11V2A1.25 1.25 0 0 1 2 .75';
const notched = `M2 .75H12.5L15.4 5 18.3 .75${edge}Z`;
const blank = `M2 .75${edge}Z`;
const said = { done: 'Done: ', now: 'Now: ', todo: 'To come: ' } as const;

/** The custody steps of a lot, each with its small stone: filled when done, notched and outlined now, plain to come. */
export function ChainList({ steps }: { steps: readonly ChainStep[] }) {
  return (
    <ol>
      {steps.map(({ name, note, state }) => (
        <li key={name} data-state={state} aria-current={state === 'now' ? 'step' : undefined}>
          <svg width="22" height="13" viewBox="0 0 22 13" aria-hidden="true">
            <path d={state === 'todo' ? blank : notched} />
          </svg>
          <strong>
            <span className="sr-only">{said[state]}</span>
            {name}
          </strong>
          {note && <span className="chain-note">{note}</span>}
        </li>
      ))}
    </ol>
  );
}
