import type { TotpSetup } from '@lydite/contracts';
import { useEffect, useRef } from 'react';
import { takeFocus } from './take-focus.ts';

/** What the app takes over: a code to scan, and the same as text. As an image, the drawing cannot run anything. */
export function SetupCode({ setup: { secret, uri, qrSvg } }: { setup: TotpSetup }) {
  const image = useRef<HTMLImageElement>(null);
  useEffect(() => {
    const url = URL.createObjectURL(new Blob([qrSvg], { type: 'image/svg+xml' }));
    if (image.current) image.current.src = url;
    return () => URL.revokeObjectURL(url);
  }, [qrSvg]);
  return (
    <div ref={takeFocus} tabIndex={-1} className="mt-4 flex flex-wrap items-center gap-6">
      <img ref={image} width={184} height={184} alt="Code to scan with the authenticator app" />
      <div className="min-w-0 max-w-md">
        <p>
          Scan the code with the app, or <a href={uri}>open it on this device</a>. Without a camera, type this key:
        </p>
        <p className="font-mono break-all">{secret.match(/.{1,4}/g)?.join(' ')}</p>
      </div>
    </div>
  );
}
