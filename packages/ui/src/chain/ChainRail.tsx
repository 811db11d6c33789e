import { ChainList } from './ChainList.tsx';
import type { ChainStep } from './chain-types.ts';

interface ChainProps {
  /** The lot's short code, "L-2481". */
  code: string;
  steps: readonly ChainStep[];
}

/** The chain of custody in the left rail; the same rail stays through a lot's whole life. */
export function ChainRail({ code, steps }: ChainProps) {
  return (
    <nav className="chain chain-rail" aria-label={`Progress of lot ${code}`}>
      <h2>
        Lot <span className="mono">{code}</span>
      </h2>
      <ChainList steps={steps} />
    </nav>
  );
}

/** The rail on phones: one line that opens into the whole chain. `aside` stands at its end, such as the closing time. */
export function ChainSteps({ code, steps, aside }: ChainProps & { aside?: string }) {
  const at = steps.findIndex(({ state }) => state === 'now');
  const shown = at < 0 ? steps.length - 1 : at;
  return (
    <details className="chain chain-steps" aria-label={`Progress of lot ${code}`}>
      <summary>
        <span>
          <b>{steps[shown]?.name}</b>, step {shown + 1} of {steps.length}
        </span>
        {aside && <span>{aside}</span>}
      </summary>
      <ChainList steps={steps} />
    </details>
  );
}
