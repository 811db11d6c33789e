import type { DealView, WeighInView } from '@lydite/contracts';
import { FactList, formatMassG, formatShare, MINUS, Notice } from '@lydite/ui';
import { addressOf } from '../../call/call.ts';
import { useWords } from '../../market/use-words.ts';

const signed = (massG: number): string => `${massG > 0 ? '+' : massG < 0 ? MINUS : ''}${formatMassG(Math.abs(massG))}`;

function countersignWords(deal: DealView, { countersignedAt }: WeighInView, moment: (iso: string) => string): string {
  if (countersignedAt) return moment(countersignedAt);
  if (!deal.settlement) return 'Not yet';
  return deal.claim ? 'By accepting the claim' : 'Not in time: the weigh-in stands';
}

/** What came off the scale, against what was declared. */
export function WeighInSection({ deal, weighIn }: { deal: DealView; weighIn: WeighInView }) {
  const { moment, exactMoney } = useWords();
  const isShort = weighIn.differenceG < -weighIn.toleranceG;
  return (
    <section aria-labelledby="weigh-in-title" className="mt-10">
      <h2 id="weigh-in-title">Weigh-in</h2>
      <p className="say mt-1">
        <b>{formatMassG(weighIn.netG)}</b> net against <b>{formatMassG(weighIn.declaredG)}</b> declared:{' '}
        {differenceWords(weighIn)}
      </p>
      {isShort && weighIn.claimableMinor > 0 && (
        <div className="mt-3">
          <Notice tone="warn">
            {deal.claim
              ? `The claim takes ${exactMoney(deal.claim.adjustmentMinor)} off the price.`
              : `A claim would take ${exactMoney(weighIn.claimableMinor)} off the price.`}
          </Notice>
        </div>
      )}
      <div className="mt-4">
        <FactList
          facts={[
            { name: 'Gross', value: <span className="num">{formatMassG(weighIn.grossG)}</span> },
            { name: 'Tare', value: <span className="num">{formatMassG(weighIn.tareG)}</span> },
            { name: 'Net', value: <b className="num">{formatMassG(weighIn.netG)}</b> },
            {
              name: 'Difference',
              value: (
                <>
                  <span className="num">{signed(weighIn.differenceG)}</span>, tolerance{' '}
                  <span className="num">{formatMassG(weighIn.toleranceG)}</span>
                </>
              ),
            },
            {
              name: 'Scale',
              value: `reads to ${formatMassG(weighIn.scaleResolutionG)}${weighIn.scaleSerial ? `, no. ${weighIn.scaleSerial}` : ''}`,
            },
            { name: 'Entered', value: moment(weighIn.at) },
            {
              name: 'Countersigned',
              value: countersignWords(deal, weighIn, moment),
            },
            ...(weighIn.note ? [{ name: 'Note', value: weighIn.note }] : []),
          ]}
        />
      </div>
      {weighIn.photos.length > 0 && (
        <ul className="mt-4 flex flex-wrap gap-2">
          {weighIn.photos.map((photo) => (
            <li key={photo.id}>
              <a href={addressOf('GET /photos/:photoId/:size', { photoId: photo.id, size: 'zoom' })}>
                <img
                  src={addressOf('GET /photos/:photoId/:size', { photoId: photo.id, size: 'list' })}
                  alt={photo.description || 'Photo of the weigh-in'}
                  width="144"
                  height="108"
                  loading="lazy"
                  className="h-27 w-36 object-cover"
                  style={{ background: photo.colour }}
                />
              </a>
            </li>
          ))}
        </ul>
      )}
    </section>
  );
}

function differenceWords({ differenceG, declaredG, toleranceG }: WeighInView): string {
  if (differenceG === 0) return 'just as declared.';
  const share = formatShare(Math.abs(differenceG) / declaredG, 2);
  const by = `${formatMassG(Math.abs(differenceG))} (${share}) ${differenceG < 0 ? 'short' : 'more'}`;
  return Math.abs(differenceG) <= toleranceG ? `${by}, within the tolerance.` : `${by}, beyond the tolerance.`;
}
