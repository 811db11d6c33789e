import { crc32, deflateSync } from 'node:zlib';
import sharp from 'sharp';

/** A plain photo of its own colour. */
export const plainPhoto = (options: { width?: number; height?: number; colour?: string } = {}): Promise<Buffer> => {
  const { width = 640, height = 480, colour = '#2f6b45' } = options;
  return sharp({ create: { width, height, channels: 3, background: colour } })
    .jpeg()
    .toBuffer();
};

/** A portrait photo as a phone keeps it: on its side, with place, camera and time written into it. */
export const phonePhoto = (): Promise<Buffer> =>
  sharp({ create: { width: 3200, height: 1600, channels: 3, background: '#8a6d3b' } })
    .withExif({
      IFD0: { Make: 'Phone maker', Orientation: '6' },
      IFD2: { DateTimeOriginal: '2026:03:01 10:00:00' },
      IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '47/1 30/1 0/1', GPSLongitudeRef: 'E', GPSLongitude: '14/1 15/1 0/1' },
    })
    .withMetadata({ orientation: 6 })
    .jpeg()
    .toBuffer();

function chunk(kind: string, data: Buffer): Buffer {
  const body = Buffer.concat([Buffer.from(kind, 'latin1'), data]);
  const [length, check] = [Buffer.alloc(4), Buffer.alloc(4)];
  length.writeUInt32BE(data.length);
  check.writeUInt32BE(crc32(body));
  return Buffer.concat([length, body, check]);
}

/** A valid black PNG of 30 000 × 30 000 pixels in about a hundred kilobytes. */
export function hugePng(): Buffer {
  const side = 30_000;
  const header = Buffer.alloc(13);
  header.writeUInt32BE(side, 0);
  header.writeUInt32BE(side, 4);
  header.writeUInt8(1, 8);
  const rows = Buffer.alloc(side * (side / 8 + 1));
  return Buffer.concat([
    Buffer.from('89504e470d0a1a0a', 'hex'),
    chunk('IHDR', header),
    chunk('IDAT', deflateSync(rows, { level: 1 })),
    chunk('IEND', Buffer.alloc(0)),
  ]);
}

export const svgDrawing = (): Buffer =>
  Buffer.from('<svg xmlns="http://www.w3.org/2000/svg" width="9" height="9"><script>alert(1)</script></svg>');

/** 40 MB that begin like a JPEG. */
export const fortyMegabytes = (): Buffer => {
  const bytes = Buffer.alloc(40 * 1024 * 1024);
  bytes.set([0xff, 0xd8, 0xff, 0xe0]);
  return bytes;
};

/** The form a browser would send a photo in. */
export function photoForm(bytes: Buffer, { name = 'photo.jpg', slot = '' } = {}): FormData {
  const form = new FormData();
  if (slot) form.set('slot', slot);
  form.set('photo', new Blob([new Uint8Array(bytes)]), name);
  return form;
}
