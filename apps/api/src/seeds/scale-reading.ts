import sharp from 'sharp';

/** What a scale was loaded with, and how finely it reads. */
export interface Weighing {
  netG: number;
  tareG: number;
  resolutionG: number;
}

interface Display {
  width: number;
  height: number;
  /** From the display's own plane, about its middle, to the picture's pixels: a, b, c, d, e, f as in SVG's `matrix`. */
  matrix: readonly [number, number, number, number, number, number];
}

/** Where the pictures with an empty display have it, as scripts/demo-photos draws and photographs them. */
const displays = {
  'sack-floor-scale': { width: 447.2, height: 124.8, matrix: [0.8816, 0.0043, -0.0081, 0.8836, 1045.85, 144.21] },
  'memory-crate-scale': { width: 430, height: 120, matrix: [0.8921, -0.0044, -0.0083, 0.8891, 640.5, 823.48] },
} as const satisfies Record<string, Display>;
export type ScalePicture = keyof typeof displays;

export const isScalePicture = (file: string): file is ScalePicture => file in displays;

/** The gross mass in kilograms, with the decimals that the scale has: `16.33`. */
export const readingOf = ({ netG, tareG, resolutionG }: Weighing): string => {
  const decimals = Math.max(0, 3 - Math.floor(Math.log10(resolutionG)));
  return ((Math.round((netG + tareG) / resolutionG) * resolutionG) / 1000).toFixed(decimals);
};

type Point = readonly [x: number, y: number];

/** A straight line with round ends; a dot is one of no length. */
interface Stroke {
  from: Point;
  to: Point;
  halfWidth: number;
  opacity: number;
}

/** The seven strokes of a digit 28 wide and 52 high, named as usual: `a` on top, then clockwise, `g` across the middle. */
const segments: Record<string, readonly [Point, Point]> = {
  a: [
    [4, 0],
    [24, 0],
  ],
  b: [
    [28, 3],
    [28, 23],
  ],
  c: [
    [28, 29],
    [28, 49],
  ],
  d: [
    [4, 52],
    [24, 52],
  ],
  e: [
    [0, 29],
    [0, 49],
  ],
  f: [
    [0, 3],
    [0, 23],
  ],
  g: [
    [4, 26],
    [24, 26],
  ],
};
const litSegments = ['abcdef', 'bc', 'abged', 'abgcd', 'fgbc', 'afgcd', 'afgedc', 'abc', 'abcdefg', 'abcdfg'];
const digitHeight = 52;
const unlitOpacity = 0.06;
const lean = -Math.tan((4 * Math.PI) / 180);

/** The signs of a reading, from the right to the left. */
function strokesOf(reading: string, { width, height }: Display): Stroke[] {
  const scale = (height * 0.56) / digitHeight;
  let left = width / 2 - height * 0.5;
  return [...reading].toReversed().flatMap((sign) => {
    left -= (sign === '.' ? 9 : 40) * scale;
    const origin = left;
    const dot: Point = [origin, height * 0.32];
    if (sign === '.') return [{ from: dot, to: dot, halfWidth: 4.6 * scale, opacity: 1 }];
    const place = ([x, y]: Point): Point => [origin + (x + y * lean) * scale, y * scale - height * 0.24];
    return Object.entries(segments).map(([name, [from, to]]) => {
      const opacity = litSegments[Number(sign)]!.includes(name) ? 1 : unlitOpacity;
      return { from: place(from), to: place(to), halfWidth: 3.25 * scale, opacity };
    });
  });
}

function distance([x, y]: Point, { from, to }: Stroke): number {
  const [dx, dy] = [to[0] - from[0], to[1] - from[1]];
  const length2 = dx * dx + dy * dy;
  const along = length2 === 0 ? 0 : ((x - from[0]) * dx + (y - from[1]) * dy) / length2;
  const share = Math.min(1, Math.max(0, along));
  return Math.hypot(x - from[0] - share * dx, y - from[1] - share * dy);
}

const ink = [0x1d, 0x25, 0x1c] as const;
/** How many pixels an edge takes to fade: the lens is not quite sharp. */
const edgePx = 1.9;

/** The reading in ink on nothing, over the box of the picture that holds the display. */
function drawReading(reading: string, display: Display) {
  const [a, b, c, d, e, f] = display.matrix;
  const [width, height] = [Math.ceil(display.width * a), Math.ceil(display.height * d)];
  const [left, top] = [Math.round(e - width / 2), Math.round(f - height / 2)];
  const toBox = ([x, y]: Point): Point => [a * x + c * y + e - left, b * x + d * y + f - top];
  const input = Buffer.alloc(width * height * 4);
  for (const { from, to, halfWidth, opacity } of strokesOf(reading, display)) {
    const stroke = { from: toBox(from), to: toBox(to), halfWidth: halfWidth * a, opacity };
    const reach = stroke.halfWidth + edgePx;
    const xs = [stroke.from[0], stroke.to[0]];
    const ys = [stroke.from[1], stroke.to[1]];
    for (let y = Math.floor(Math.min(...ys) - reach); y <= Math.max(...ys) + reach; y += 1)
      for (let x = Math.floor(Math.min(...xs) - reach); x <= Math.max(...xs) + reach; x += 1) {
        const at = (y * width + x) * 4;
        const alpha = Math.round(255 * coverage([x + 0.5, y + 0.5], stroke));
        if (alpha > input[at + 3]!) input.set([...ink, alpha], at);
      }
  }
  return { input, raw: { width, height, channels: 4 as const }, left, top };
}

const coverage = (point: Point, stroke: Stroke): number =>
  stroke.opacity * Math.min(1, Math.max(0, (stroke.halfWidth - distance(point, stroke)) / edgePx + 0.5));

/**
 * The picture of a scale, its empty display showing a reading such as `16.33`, as a JPEG. The digits are drawn as strokes: a
 * machine may have no fonts, and the market's image library is not let near drawings.
 */
export const showReading = (path: string, file: ScalePicture, reading: string): Promise<Buffer> =>
  sharp(path)
    .composite([drawReading(reading, displays[file])])
    .jpeg({ quality: 84 })
    .toBuffer();
