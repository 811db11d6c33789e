import { stageNames, stages, type Stage, type Standing } from '../lot-stage.ts';

const edge = 'H20A1.25 1.25 0 0 1 21.25 2v9A1.25 1.25 0 0 1 20 12.25H2A1.25 1.25 0 0 1 .75 11V2A1.25 1.25 0 0 1 2 .75';
const shapes = { todo: `M2 .75${edge}Z`, notched: `M2 .75H12.5L15.4 5 18.3 .75${edge}Z` };

type MarkState = 'done' | 'now' | 'todo' | 'none';

/** What one stage shows for a lot: behind it, where it is, to come, or never to come. */
export function markState({ stage, isPaid, hasEnded }: Standing, of: Stage): MarkState {
  const [at, here] = [stages.indexOf(stage), stages.indexOf(of)];
  if (isPaid || here < at) return 'done';
  if (here === at) return hasEnded ? 'none' : 'now';
  return hasEnded ? 'none' : 'todo';
}

const said: Record<MarkState, string> = { done: 'done', now: 'now', todo: 'to come', none: 'not reached' };

/** A stage as its small stone: filled when done, notched now, plain to come, a dash when the lot has left the chain. */
export function StageMark({ standing, stage }: { standing: Standing; stage: Stage }) {
  const state = markState(standing, stage);
  return (
    <span className="stage-mark" data-state={state}>
      {state === 'none' ? (
        <span aria-hidden="true">–</span>
      ) : (
        <svg width="22" height="13" viewBox="0 0 22 13" aria-hidden="true">
          <path d={state === 'todo' ? shapes.todo : shapes.notched} />
        </svg>
      )}
      <span className="sr-only">{said[state]}</span>
    </span>
  );
}

/** All stages in one line, for narrow screens; the words beside it say where it stands. */
export function StageLine({ standing }: { standing: Standing }) {
  return (
    <span className="stage-line" aria-hidden="true">
      {stages.map((stage) => (
        <StageMark key={stage} standing={standing} stage={stage} />
      ))}
    </span>
  );
}

export const stageHeads = stages.map((stage) => ({ stage, name: stageNames[stage] }));
