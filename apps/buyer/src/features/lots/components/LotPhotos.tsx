import type { PhotoView } from '@lydite/contracts';
import { Button } from '@lydite/ui';
import { useRef, useState, type KeyboardEvent } from 'react';
import { photoSrc } from '../../../lib/photo-src.ts';

/** The seller's photos with their descriptions; each opens large. */
export function LotPhotos({ photos }: { photos: readonly PhotoView[] }) {
  const dialog = useRef<HTMLDialogElement>(null);
  const [at, setAt] = useState(0);
  const open = (index: number) => {
    setAt(index);
    dialog.current?.showModal();
  };
  if (photos.length === 0) return <p className="mute mt-3">The seller added no photos.</p>;
  return (
    <>
      <div className="photos">
        {photos.map((photo, i) => (
          <figure key={photo.id}>
            <button type="button" className="lot-photo" onClick={() => open(i)}>
              <img
                src={photoSrc(photo.id, 'page')}
                alt={photo.description || `Photo ${i + 1}`}
                width={photo.width}
                height={photo.height}
                loading={i === 0 ? 'eager' : 'lazy'}
                style={{ backgroundColor: photo.colour }}
              />
              <span className="sr-only">Look closely</span>
            </button>
            {i === 0 && photo.description && <figcaption>{photo.description}</figcaption>}
          </figure>
        ))}
      </div>
      <ZoomDialog ref={dialog} photos={photos} at={at} onMove={setAt} />
    </>
  );
}

interface ZoomDialogProps {
  ref: React.RefObject<HTMLDialogElement | null>;
  photos: readonly PhotoView[];
  at: number;
  onMove: (index: number) => void;
}

function ZoomDialog({ ref, photos, at, onMove }: ZoomDialogProps) {
  const photo = photos[at];
  const last = photos.length - 1;
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key === 'ArrowLeft') onMove(Math.max(0, at - 1));
    if (event.key === 'ArrowRight') onMove(Math.min(last, at + 1));
  };
  return (
    <dialog ref={ref} className="lot-zoom" aria-label="Photo, large" onKeyDown={onKeyDown}>
      {photo && (
        <figure>
          <img src={photoSrc(photo.id, 'zoom')} alt={photo.description || `Photo ${at + 1}`} />
          <figcaption aria-live="polite">
            {at + 1} of {photos.length}
            {photo.description && `. ${photo.description}`}
          </figcaption>
        </figure>
      )}
      <div className="actions">
        <Button disabled={at === 0} onClick={() => onMove(at - 1)}>
          Previous
        </Button>
        <Button disabled={at === last} onClick={() => onMove(at + 1)}>
          Next
        </Button>
        <Button look="quiet" onClick={() => ref.current?.close()}>
          Close
        </Button>
      </div>
    </dialog>
  );
}
