import { useWords } from '@lydite/client';
import { formatAbout } from '@lydite/ui';
import type { BidReading } from './lot-worth.ts';

/** What a bid means in one line: how often it comes out ahead, and the worst one in ten. */
export function ReadingWords({ reading: { ahead, of, worseMinor } }: { reading: BidReading }) {
  const { currency } = useWords();
  return (
    <>
      You come out ahead in{' '}
      <b>
        {ahead} of {of}
      </b>{' '}
      results. 1 in 10 leaves you <b className="nowrap">{formatAbout(worseMinor, currency, { signed: true })}</b> or
      less
    </>
  );
}
