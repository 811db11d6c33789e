import { randomUUID } from 'node:crypto';
import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import type { PhotoView } from '@lydite/contracts';
import { Photo } from '../features/photos/photo.entity.ts';
import { originalKey, sizeKey } from '../features/photos/photo-keys.ts';
import { toPhotoView } from '../features/photos/photos.reads.ts';
import { photoSizes, processPhoto, type PhotoSize, type ProcessedPhoto } from '../features/photos/process-photo.ts';
import type { World } from '../platform/world.ts';
import type { Picture, PhotoPlan } from './lot-plan.ts';
import { isScalePicture, readingOf, showReading } from './scale-reading.ts';

/** The rendered photos of the demo, without their ending. */
export const photoFiles = [
  'ball-grid-packages',
  'card-modules',
  'ceramic-processors',
  'connectors-whole',
  'console-boards',
  'contact-pins',
  'desktop-main-boards',
  'edge-contacts-close',
  'edge-contacts-heap',
  'expansion-cards',
  'fibre-processors-land',
  'fibre-processors-pinned',
  'hard-drive-boards',
  'memory-close',
  'memory-crate-scale',
  'memory-rows',
  'mixed-boards-crate',
  'network-boards',
  'notebook-boards',
  'package-tops-dish',
  'phone-boards',
  'plastic-chips',
  'player-boards',
  'power-boards',
  'sack-floor-scale',
  'server-boards',
  'telecom-card',
  'weigh-ticket',
] as const;
export type PhotoFile = (typeof photoFiles)[number];

type Hanging = PhotoPlan & {
  ownerId: string;
  of: { lotId: string } | { dealId: string };
  position: number;
};

interface Print {
  original: Buffer;
  photo: ProcessedPhoto;
}

const sizes = Object.keys(photoSizes) as PhotoSize[];
const atOnce = 2;

/**
 * Photos for the demo's lots and deals. Each file goes once through what every photo goes through, in the background from the
 * beginning; the bytes serve all lots that show it. The picture of a scale is made for each reading, when it is first wanted.
 */
export function openAlbum({ db, files }: Pick<World, 'db' | 'files'>, folder: string) {
  const prints = new Map<string, Promise<Print>>();
  const lanes: Promise<unknown>[] = Array.from({ length: atOnce }, () => Promise.resolve());
  const pathOf = (file: PhotoFile) => join(folder, `${file}.jpg`);
  for (const [index, file] of photoFiles.filter((one) => !isScalePicture(one)).entries()) {
    const print = lanes[index % atOnce]!.then(() => readFile(pathOf(file))).then(develop);
    prints.set(file, print);
    // Whoever needs the photo hears of its failure; the next in the lane goes on.
    lanes[index % atOnce] = print.catch(() => {});
  }

  const printOf = (picture: Picture): Promise<Print> => {
    if (!('weighing' in picture)) return prints.get(picture.file)!;
    const { file } = picture;
    const reading = readingOf(picture.weighing);
    const key = `${file} ${reading}`;
    const print = prints.get(key) ?? showReading(pathOf(file), file, reading).then(develop);
    prints.set(key, print);
    return print;
  };

  return {
    async hang({ ownerId, of, slot, position, description, ...picture }: Hanging): Promise<PhotoView> {
      const { original, photo } = await printOf(picture);
      const { width, height, colour } = photo;
      const id = randomUUID();
      await Promise.all([
        files.put(originalKey(id), original),
        ...sizes.map((size) => files.put(sizeKey(id, size), photo.files[size])),
      ]);
      const lotId = 'lotId' in of ? of.lotId : null;
      const dealId = 'dealId' in of ? of.dealId : null;
      await db.manager.insert(Photo, {
        id,
        ownerId,
        lotId,
        dealId,
        slot,
        position,
        description,
        width,
        height,
        colour,
      });
      return toPhotoView(await db.manager.findOneByOrFail(Photo, { id }));
    },
  };
}
export type Album = ReturnType<typeof openAlbum>;

const develop = async (original: Buffer): Promise<Print> => ({ original, photo: await processPhoto(original, 'jpeg') });
