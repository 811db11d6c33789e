import { formatMassG, MINUS, Notice } from '@lydite/ui';
import { differenceOf, netOf, type WeighInEntries } from './weigh-in.rules.ts';

/** The net mass by arithmetic shown, and what it means against the declared one. */
export function NetMass({ entries, declaredG }: { entries: WeighInEntries; declaredG: number }) {
  const netG = netOf(entries);
  const found = differenceOf(entries, declaredG);
  return (
    <div className="sheet p-4.5" aria-live="polite">
      <p className="small mute">
        Net, gross less tare
        {netG !== null && (
          <span className="num">
            {' '}
            {formatMassG(entries.gross.value ?? 0)} {MINUS} {formatMassG(entries.tare.value ?? 0)}
          </span>
        )}
      </p>
      <p className="readout mt-1">{netG === null ? '–' : formatMassG(netG)}</p>
      <p className="small mute mt-1">{formatMassG(declaredG)} was declared</p>
      {netG !== null && netG <= 0 && (
        <div className="mt-3">
          <Notice tone="warn">The tare is not less than the gross mass. Are the two swapped?</Notice>
        </div>
      )}
      {found && <p className="mt-2">{differenceWords(found)}</p>}
    </div>
  );
}

function differenceWords({ differenceG, toleranceG, withinTolerance }: NonNullable<ReturnType<typeof differenceOf>>) {
  const tolerance = `the tolerance of ${formatMassG(toleranceG)}`;
  if (differenceG === 0) return 'Just as declared.';
  const by = `${formatMassG(Math.abs(differenceG))} ${differenceG < 0 ? 'short' : 'more than declared'}`;
  if (withinTolerance) return `${by}, within ${tolerance}.`;
  return differenceG < 0
    ? `${by}, beyond ${tolerance}. You can claim the whole shortage after the weigh-in.`
    : `${by}, beyond ${tolerance}. An excess is not paid.`;
}
