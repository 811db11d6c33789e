import type { Shot } from '../photo-slots.ts';
import { PhotoInputs } from './PhotoInputs.tsx';

interface EmptyShotProps {
  shot: Pick<Shot, 'title' | 'hint'>;
  onChoose: (files: File[]) => void;
}

/** A shot nobody has taken yet. */
export function EmptyShot({ shot, onChoose }: EmptyShotProps) {
  return (
    <li className="shot">
      <div className="shot-picture shot-empty" aria-hidden="true">
        <svg viewBox="0 0 32 26" width="32" height="26">
          <path d="M2 6.5h7L11.5 2h9L23 6.5h7v17H2z M16 19.5a5.5 5.5 0 1 0 0-11 5.5 5.5 0 0 0 0 11Z" />
        </svg>
      </div>
      <div className="shot-words">
        <h2>{shot.title}</h2>
        <p className="small mute">{shot.hint}</p>
        <div className="shot-actions">
          <PhotoInputs what={shot.title} onChoose={onChoose} />
        </div>
      </div>
    </li>
  );
}
