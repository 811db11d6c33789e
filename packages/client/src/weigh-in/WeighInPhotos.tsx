import type { PhotoView } from '@lydite/contracts';
import { FieldError, formatShare } from '@lydite/ui';
import { useId, type ChangeEvent } from 'react';
import { addressOf } from '../call/call.ts';
import type { PendingPhoto } from './use-photo-uploads.ts';

interface WeighInPhotosProps {
  photos: readonly PhotoView[];
  pending: readonly PendingPhoto[];
  error: string | null;
  onAdd: (files: Iterable<File>) => void;
  onRetry: (photo: PendingPhoto) => void;
  onDrop: (id: string) => void;
  onRemove: (id: string) => void;
}

const pick =
  'btn has-[:focus-visible]:outline-3 has-[:focus-visible]:outline-offset-2 has-[:focus-visible]:outline-action';

/** Kinds that every browser can hand over; phones turn their own into one of them. */
const accept = 'image/jpeg,image/png,image/webp';

/** Photos of the scale's display or the ticket: taken now, or chosen from the gallery. */
export function WeighInPhotos({ photos, pending, error, onAdd, onRetry, onDrop, onRemove }: WeighInPhotosProps) {
  const errorId = useId();
  const choose = (event: ChangeEvent<HTMLInputElement>) => {
    onAdd(event.target.files ?? []);
    // The same file can be chosen again after it was removed.
    event.target.value = '';
  };
  return (
    <fieldset className={error ? 'field field-invalid' : 'field'} id="photoIds" tabIndex={-1}>
      <legend>Photos</legend>
      <p className="field-hint">
        The scale’s display with the lot on it, or the ticket. The place is removed from them.
      </p>
      {error && <FieldError id={errorId}>{error}</FieldError>}
      <div className="flex flex-wrap gap-3">
        <label className={pick}>
          Take a photo
          <input type="file" accept={accept} capture="environment" className="sr-only" onChange={choose} />
        </label>
        <label className={pick}>
          Choose photos
          <input type="file" accept={accept} multiple className="sr-only" onChange={choose} />
        </label>
      </div>
      {(photos.length > 0 || pending.length > 0) && (
        <ul className="ruled mt-3">
          {photos.map((photo, index) => (
            <li key={photo.id} className="flex items-center gap-4">
              <img
                src={addressOf('GET /photos/:photoId/:size', { photoId: photo.id, size: 'list' })}
                alt=""
                width="72"
                height="54"
                className="h-13.5 w-18 object-cover"
              />
              <span className="small">Photo {index + 1}, sent</span>
              <button type="button" className="btn btn-quiet ml-auto" onClick={() => onRemove(photo.id)}>
                Leave out<span className="sr-only"> photo {index + 1}</span>
              </button>
            </li>
          ))}
          {pending.map((photo) => (
            <li key={photo.id} className="small">
              {photo.file.name}: {photo.error ?? progressWords(photo.share)}
              {photo.error && (
                <span className="flex gap-3">
                  <button type="button" className="btn btn-quiet" onClick={() => onRetry(photo)}>
                    Send again<span className="sr-only"> {photo.file.name}</span>
                  </button>
                  <button type="button" className="btn btn-quiet" onClick={() => onDrop(photo.id)}>
                    Leave out<span className="sr-only"> {photo.file.name}</span>
                  </button>
                </span>
              )}
            </li>
          ))}
        </ul>
      )}
    </fieldset>
  );
}

const progressWords = (share: number): string =>
  share === 0 ? 'waits' : share < 1 ? `${formatShare(share, 0)} sent` : 'being checked';
