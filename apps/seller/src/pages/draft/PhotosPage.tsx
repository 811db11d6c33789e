import { useTitle } from '@lydite/client';
import { Notice } from '@lydite/ui';
import { useDraft } from '../../features/draft/draft-context.tsx';
import { EmptyShot } from '../../features/photos/components/EmptyShot.tsx';
import { PhotoRow } from '../../features/photos/components/PhotoRow.tsx';
import { WaitingRow } from '../../features/photos/components/WaitingRow.tsx';
import { usePhotoSending } from '../../features/photos/photo-queue-context.tsx';
import { shots } from '../../features/photos/photo-slots.ts';
import { usePhotoOrder } from '../../features/photos/use-photo-order.ts';

const another = { title: 'More photos', hint: 'Anything else a buyer would turn over in the hand.' };

/** Photos in the order buyers see them, those on their way, and the shots still to take. */
export function Component() {
  useTitle('Photograph the lot');
  const { lot, setPhotos, refresh } = useDraft();
  const { photos: waiting, isOffline, choose, retry, cancel } = usePhotoSending();
  const order = usePhotoOrder({ lotCode: lot.code, photos: lot.photos, onPhotos: setPhotos, refresh });
  const taken = new Set([...lot.photos, ...waiting].map(({ slot }) => slot));
  return (
    <>
      <h1 id="photos">Photograph the lot</h1>
      <p className="lead">
        Five shots tell buyers most. Lay a ruler beside the pieces. The place a photo was taken at is removed from it.
      </p>
      {isOffline && (
        <div className="mt-4">
          <Notice live title="No connection.">
            Photos are kept on this device and go up one by one when it is back. You can carry on.
          </Notice>
        </div>
      )}
      {order.problem && (
        <div className="mt-4">
          <Notice tone="danger" live>
            {order.problem}
          </Notice>
        </div>
      )}
      <ul className="shots">
        {lot.photos.map((photo, place) => (
          <PhotoRow
            key={photo.id}
            photo={photo}
            place={place}
            count={lot.photos.length}
            isBusy={order.isBusy}
            onMove={(by) => void order.move(photo.id, by)}
            onDescribe={(description) => void order.describe(photo.id, description)}
            onRetake={(files) => choose(files.slice(0, 1), photo.slot, photo.id)}
            onRemove={() => void order.remove(photo.id)}
          />
        ))}
        {waiting.map((photo) => (
          <WaitingRow key={photo.id} photo={photo} onRetry={() => retry(photo.id)} onCancel={() => cancel(photo.id)} />
        ))}
        {shots
          .filter(({ slot }) => !taken.has(slot))
          .map((shot) => (
            <EmptyShot key={shot.slot} shot={shot} onChoose={(files) => choose(files, shot.slot)} />
          ))}
        <EmptyShot shot={another} onChoose={(files) => choose(files, 'other')} />
      </ul>
    </>
  );
}
