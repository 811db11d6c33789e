import { addressOf } from '../../call/call.ts';

/** A lot's cover in a list; decoration beside its title. */
export function LotThumb({ photoId }: { photoId: string | null }) {
  if (!photoId) return null;
  return (
    <img
      src={addressOf('GET /photos/:photoId/:size', { photoId, size: 'list' })}
      alt=""
      width="56"
      height="56"
      loading="lazy"
      decoding="async"
    />
  );
}
