import { useEffect, useState } from 'react';
import { useMarket } from './market.queries.ts';

/** The market's clock, looked at every so often; a minute unless the page needs it finer. */
export function useNow(everyMs = 60_000): Date {
  const { aheadMs } = useMarket();
  const [deviceMs, setDeviceMs] = useState(() => Date.now());
  useEffect(() => {
    const timer = setInterval(() => setDeviceMs(Date.now()), everyMs);
    return () => clearInterval(timer);
  }, [everyMs]);
  return new Date(deviceMs + aheadMs);
}
