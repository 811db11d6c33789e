import { Button, FieldError, formatNumber } from '@lydite/ui';
import { useCallback } from 'react';
import type { QueuedPhoto } from '../photo-queue.ts';
import { shotOf } from '../photo-slots.ts';

const megabytes = (bytes: number) => formatNumber(bytes / 1e6, { minimumFractionDigits: 1, maximumFractionDigits: 1 });

function progressWords({ state, share, file }: QueuedPhoto): string {
  if (state === 'waiting') return 'Waits for its turn';
  if (share >= 1) return 'Sent, being checked and resized';
  return `Sending, ${megabytes(file.size * share)} of ${megabytes(file.size)} MB`;
}

interface WaitingRowProps {
  photo: QueuedPhoto;
  onRetry: () => void;
  onCancel: () => void;
}

/** A photo on its way, or one that was refused: what happens to it in words, and the way out. */
export function WaitingRow({ photo, onRetry, onCancel }: WaitingRowProps) {
  const isRefused = photo.state === 'refused';
  const errorId = `${photo.id}-error`;
  return (
    <li className="shot">
      <div className="shot-picture shot-waiting">
        <Preview file={photo.file} />
        {photo.state === 'sending' && <progress max={1} value={photo.share} aria-label={`Sending ${photo.name}`} />}
      </div>
      <div className="shot-words">
        <h2>{shotOf(photo.slot).title}</h2>
        {isRefused && <FieldError id={errorId}>{photo.message}</FieldError>}
        <p className="small mute break-words">
          {photo.name}
          {isRefused ? '. Not sent; it is still here.' : `. ${progressWords(photo)}`}
        </p>
        <div className="shot-actions">
          {isRefused && (
            <Button look="quiet" onClick={onRetry} aria-describedby={errorId}>
              Try again<span className="sr-only"> with {photo.name}</span>
            </Button>
          )}
          <Button look="quiet" onClick={onCancel}>
            {isRefused ? 'Let it go' : 'Cancel'}
            <span className="sr-only">: {photo.name}</span>
          </Button>
        </div>
      </div>
    </li>
  );
}

/** The picture from this device; nothing where it is no picture. */
function Preview({ file }: { file: Blob }) {
  const show = useCallback(
    (image: HTMLImageElement | null) => {
      if (!image) return;
      const url = URL.createObjectURL(file);
      image.src = url;
      return () => URL.revokeObjectURL(url);
    },
    [file],
  );
  return <img ref={show} alt="" onError={({ currentTarget }) => (currentTarget.hidden = true)} />;
}
