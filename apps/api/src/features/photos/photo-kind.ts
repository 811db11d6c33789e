import { open } from 'node:fs/promises';
import { AppError } from '../../platform/app-error.ts';

export type PhotoKind = 'jpeg' | 'png' | 'webp';

const phoneBrands = ['heic', 'heix', 'hevc', 'heim', 'heis', 'mif1', 'msf1'];

/** What the first bytes of a file say it is; a name proves nothing. */
export function kindOfBytes(head: Buffer): PhotoKind | 'heic' | null {
  if (head.subarray(0, 3).equals(Buffer.from([0xff, 0xd8, 0xff]))) return 'jpeg';
  if (head.subarray(0, 8).equals(Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]))) return 'png';
  const text = head.toString('latin1');
  if (text.startsWith('RIFF') && text.slice(8, 12) === 'WEBP') return 'webp';
  if (text.slice(4, 8) === 'ftyp' && phoneBrands.includes(text.slice(8, 12))) return 'heic';
  return null;
}

/** The kind of a file that was sent as a photo. @throws AppError photo.kind_refused for anything but JPEG, PNG and WebP */
export async function photoKind(path: string): Promise<PhotoKind> {
  const file = await open(path);
  const start = Buffer.alloc(16);
  try {
    await file.read(start, 0, 16, 0);
  } finally {
    await file.close();
  }
  const kind = kindOfBytes(start);
  if (kind === 'heic')
    throw new AppError(
      'photo.kind_refused',
      'This is a HEIC photo, which cannot be read here. Set the phone’s camera to JPEG, or export the photo as JPEG, and add it again.',
    );
  if (kind === null)
    throw new AppError(
      'photo.kind_refused',
      'This file is not a JPEG, PNG or WebP photo, whatever its name says. Choose a photo of one of these kinds.',
    );
  return kind;
}
