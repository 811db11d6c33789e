import type { PhotoView } from '@lydite/contracts';
import { Button, TextField } from '@lydite/ui';
import { useState } from 'react';
import { photoSrc } from '../../../lib/photo-src.ts';
import { shotOf } from '../photo-slots.ts';
import { FileButton } from './PhotoInputs.tsx';

interface PhotoRowProps {
  photo: PhotoView;
  place: number;
  count: number;
  /** While an order, a description or a removal is on its way. */
  isBusy: boolean;
  onMove: (by: -1 | 1) => void;
  onDescribe: (description: string) => void;
  onRetake: (files: File[]) => void;
  onRemove: () => void;
}

/** A photo the market has: its place, its description, and what can be done with it. */
export function PhotoRow({ photo, place, count, isBusy, onMove, onDescribe, onRetake, onRemove }: PhotoRowProps) {
  const [description, setDescription] = useState(photo.description);
  const isCover = place === 0;
  const { title } = shotOf(photo.slot);
  const which = <span className="sr-only"> photo {place + 1}</span>;
  return (
    <li className="shot">
      <img
        className="shot-picture"
        src={photoSrc(photo.id, 'list')}
        alt={photo.description || title}
        style={{ backgroundColor: photo.colour }}
      />
      <div className="shot-words">
        <h2>{title}</h2>
        <p className="small mute">{isCover ? 'Cover: the first that buyers see' : `Photo ${place + 1} of ${count}`}</p>
        <TextField
          label="What it shows"
          className="mt-3"
          optional={!isCover}
          value={description}
          onChange={(event) => setDescription(event.target.value.slice(0, 200))}
          onBlur={() => description !== photo.description && onDescribe(description)}
        />
        <div className="shot-actions">
          <FileButton look="quiet" onChoose={onRetake}>
            Retake{which}
          </FileButton>
          {!isCover && (
            <Button look="quiet" aria-disabled={isBusy} onClick={() => !isBusy && onMove(-1)}>
              Move up{which}
            </Button>
          )}
          {place < count - 1 && (
            <Button look="quiet" aria-disabled={isBusy} onClick={() => !isBusy && onMove(1)}>
              Move down{which}
            </Button>
          )}
          <Button look="quiet" aria-disabled={isBusy} onClick={() => !isBusy && onRemove()}>
            Remove{which}
          </Button>
        </div>
      </div>
    </li>
  );
}
