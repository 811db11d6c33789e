import { useNow, useWords } from '@lydite/client';

const tensOfSeconds = (lengthMs: number): string => `in ${Math.ceil(lengthMs / 10_000) * 10} seconds`;
const nearMs = 2 * 60_000;

/** How long until a close, in words: by the minute, and by ten seconds in the last two minutes. */
export function ClosingIn({ closesAt }: { closesAt: string }) {
  const { relative } = useWords();
  const leftMs = Date.parse(closesAt) - useNow().getTime();
  if (leftMs > nearMs || leftMs <= 0) return relative(closesAt);
  return <LastMinutes closesAt={closesAt} />;
}

function LastMinutes({ closesAt }: { closesAt: string }) {
  const leftMs = Date.parse(closesAt) - useNow(10_000).getTime();
  return leftMs > 0 ? tensOfSeconds(leftMs) : 'closing now';
}
