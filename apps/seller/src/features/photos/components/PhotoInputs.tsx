import { buttonClass } from '@lydite/ui';
import type { ReactNode } from 'react';

/** HEIC stays out of the list on purpose: phones then hand over JPEG by themselves. */
const kinds = 'image/jpeg,image/png,image/webp';

interface FileButtonProps {
  children: ReactNode;
  look?: 'plain' | 'quiet';
  /** Opens the camera on devices that have one. */
  camera?: boolean;
  multiple?: boolean;
  className?: string;
  onChoose: (files: File[]) => void;
}

/** A file input that looks like a button. */
export function FileButton({ children, look = 'plain', camera, multiple, className, onChoose }: FileButtonProps) {
  return (
    <label className={[buttonClass(look), 'file-button', className].filter(Boolean).join(' ')}>
      {children}
      <input
        type="file"
        className="sr-only"
        accept={kinds}
        capture={camera ? 'environment' : undefined}
        multiple={multiple}
        onChange={(event) => {
          onChoose([...(event.target.files ?? [])]);
          // The same file may be chosen again after a refusal.
          event.target.value = '';
        }}
      />
    </label>
  );
}

interface PhotoInputsProps {
  /** What is photographed, for those who hear the buttons out of their context. */
  what: string;
  onChoose: (files: File[]) => void;
}

/** Camera and gallery; the camera only where there is likely one. */
export function PhotoInputs({ what, onChoose }: PhotoInputsProps) {
  const named = <span className="sr-only">: {what}</span>;
  return (
    <>
      <FileButton camera className="camera-only" onChoose={onChoose}>
        Take photo{named}
      </FileButton>
      <FileButton multiple onChoose={onChoose}>
        Choose photos{named}
      </FileButton>
    </>
  );
}
