import { Notice } from '@lydite/ui';
import { takeFocus } from './take-focus.ts';

/** Shown once, right after the second step was set up. */
export function RecoveryCodes({ codes }: { codes: readonly string[] }) {
  return (
    <div ref={takeFocus} tabIndex={-1} className="mt-4">
      <Notice tone="warn" title="Keep these recovery codes now.">
        They are not shown again. Each signs you in once when the app is not at hand.
      </Notice>
      <ol className="mt-2 list-inside list-decimal" aria-label="Recovery codes">
        {codes.map((code) => (
          <li key={code} className="font-mono break-all">
            {code}
          </li>
        ))}
      </ol>
    </div>
  );
}
