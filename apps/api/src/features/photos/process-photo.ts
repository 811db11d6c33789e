import sharp, { type Sharp } from 'sharp';
import { AppError } from '../../platform/app-error.ts';
import type { PhotoKind } from './photo-kind.ts';

export const photoSizes = { list: 160, page: 1200, zoom: 2400 } as const;
export type PhotoSize = keyof typeof photoSizes;

/** Documented in DEVELOPERS.md. */
export const mostPixels = 50_000_000;
const decodeSeconds = 10;

// Only the three kinds taken are ever decoded, even if a file of another kind got past the check of its first bytes.
sharp.block({ operation: ['VipsForeignLoad'] });
sharp.unblock({ operation: ['VipsForeignLoadJpeg', 'VipsForeignLoadPng', 'VipsForeignLoadWebp'] });
// Photos come several at a time; one thread each keeps a burst of them from taking the whole machine.
sharp.concurrency(1);

export interface ProcessedPhoto {
  files: Record<PhotoSize, Buffer>;
  /** Of the largest size, in pixels. */
  width: number;
  height: number;
  /** Dominant colour as `#rrggbb`. */
  colour: string;
}

interface Pixels {
  data: Buffer;
  raw: { width: number; height: number; channels: 3 };
}

/**
 * Decodes a photo, given by its path or its bytes, once, turns it upright and encodes it anew as WebP in three sizes, never
 * enlarged. Nothing of the sender's file but its pixels is left: no place, no time, no camera.
 * @throws AppError photo.too_many_pixels, photo.unreadable
 */
export async function processPhoto(source: string | Buffer, kind: PhotoKind): Promise<ProcessedPhoto> {
  await assertSize(source, kind);
  const pixels = await decode(source);
  const { data, raw } = pixels;
  const [list, page, zoom] = [
    await encode(pixels, photoSizes.list),
    await encode(pixels, photoSizes.page),
    await encode(pixels, photoSizes.zoom),
  ];
  const { dominant } = await sharp(data, { raw }).stats();
  const hex = [dominant.r, dominant.g, dominant.b].map((part) => part.toString(16).padStart(2, '0')).join('');
  return { files: { list, page, zoom }, width: raw.width, height: raw.height, colour: `#${hex}` };
}

async function assertSize(source: string | Buffer, kind: PhotoKind): Promise<void> {
  // Without a limit here, since only the header is read: the answer can then say how large the photo is.
  const header = await sharp(source, { limitInputPixels: false }).metadata().catch(refuseUnreadable);
  if (header.format !== kind) refuseUnreadable();
  const megapixels = (header.width * header.height) / 1_000_000;
  if (header.width * header.height > mostPixels)
    throw new AppError(
      'photo.too_many_pixels',
      `This photo has ${header.width} × ${header.height} pixels, ${Math.round(megapixels)} megapixels. At most ${mostPixels / 1_000_000} are taken: save it smaller and add it again.`,
    );
}

async function decode(source: string | Buffer): Promise<Pixels> {
  const photo = sharp(source, { limitInputPixels: mostPixels, failOn: 'warning', pages: 1 }).timeout({
    seconds: decodeSeconds,
  });
  const { data, info } = await shrink(photo.autoOrient(), photoSizes.zoom)
    .flatten({ background: '#ffffff' })
    .toColourspace('srgb')
    .raw()
    .toBuffer({ resolveWithObject: true })
    .catch(refuseUnreadable);
  return { data, raw: { width: info.width, height: info.height, channels: 3 } };
}

const encode = ({ data, raw }: Pixels, longSide: number): Promise<Buffer> =>
  shrink(sharp(data, { raw }), longSide).webp({ quality: 80, effort: 3 }).toBuffer();

const shrink = (photo: Sharp, longSide: number): Sharp =>
  photo.resize({ width: longSide, height: longSide, fit: 'inside', withoutEnlargement: true });

function refuseUnreadable(cause?: unknown): never {
  throw new AppError(
    'photo.unreadable',
    'This photo is damaged or was cut off on its way. Open it on your device to see whether it is whole, then add it again.',
    { cause },
  );
}
