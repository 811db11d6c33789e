import { useMarket } from '@lydite/client';
import { LOCALE } from '@lydite/ui';

interface RefreshLineProps {
  /** When the shown figures were read, by this device's clock. */
  atMs: number;
  paused: boolean;
  onToggle: () => void;
}

/** When the figures were read, and the way to hold them still. */
export function RefreshLine({ atMs, paused, onToggle }: RefreshLineProps) {
  const { zone, aheadMs } = useMarket();
  const time = new Intl.DateTimeFormat(LOCALE, { timeStyle: 'medium', timeZone: zone }).format(atMs + aheadMs);
  return (
    <span className="small mute">
      Prices and bids refreshed <span className="num">{time}</span>.{' '}
      <button type="button" className="link-button" aria-pressed={paused} onClick={onToggle}>
        {paused ? 'Go on' : 'Pause'}
      </button>
    </span>
  );
}
