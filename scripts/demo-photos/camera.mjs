import sharp from 'sharp';
import { createRandom } from './shared/random.mjs';
import { sceneDocument, sceneHeight, sceneWidth } from './shared/scene.mjs';

const widthPx = 1280;
const heightPx = 960;
const drawScale = 1.5;

/** Where the picture's corners (top left, top right, bottom right, bottom left) lie in the scene, and where it is sharp. */
const views = {
  overhead: {
    corners: [
      [70, 40],
      [1530, 70],
      [1490, 1160],
      [120, 1145],
    ],
    focus: 0.5,
    blur: 0.25,
  },
  bench: {
    corners: [
      [20, 30],
      [1580, 60],
      [1420, 1165],
      [200, 1150],
    ],
    focus: 0.55,
    blur: 0.6,
  },
  low: {
    corners: [
      [10, 90],
      [1590, 40],
      [1330, 1120],
      [300, 1150],
    ],
    focus: 0.6,
    blur: 1,
  },
  front: {
    corners: [
      [80, 60],
      [1515, 50],
      [1525, 1140],
      [90, 1130],
    ],
    focus: 0.6,
    blur: 0.2,
  },
  close: {
    corners: [
      [300, 180],
      [1350, 210],
      [1290, 985],
      [350, 965],
    ],
    focus: 0.55,
    blur: 1,
  },
};

/**
 * Takes the picture: perspective, shallow focus, falling light and sensor noise, as a JPEG of 1280 × 960.
 * @param {{ drawing: string, view: keyof typeof views, seed: number, exposure?: number, warmth?: number }} scene
 * @param {{ maxBytes: number }} limit quality steps down from 84 until the file fits
 */
export async function photograph(scene, { maxBytes }) {
  const view = views[scene.view];
  const drawn = sharp(Buffer.from(sceneDocument(scene.drawing, drawScale)), { unlimited: true }).removeAlpha();
  const { data: pixels } = await drawn.raw().toBuffer({ resolveWithObject: true });
  const flat = { raw: { width: widthPx, height: heightPx, channels: 3 } };
  const sharpPixels = project(pixels, view.corners);
  const softPixels = await sharp(sharpPixels, flat).blur(3.2).raw().toBuffer();
  expose(sharpPixels, softPixels, { ...view, ...scene });
  for (let quality = 84; quality >= 54; quality -= 3) {
    const jpeg = await sharp(sharpPixels, flat).jpeg({ quality, mozjpeg: true }).toBuffer();
    if (jpeg.length <= maxBytes) return jpeg;
  }
  throw new Error(`The picture does not fit ${maxBytes} bytes at quality 54`);
}

/** The plane map that takes the unit square to four corners (Heckbert 1989, section 2.2.3). */
function planeMap([[x0, y0], [x1, y1], [x2, y2], [x3, y3]]) {
  const [dx1, dx2, sx] = [x1 - x2, x3 - x2, x0 - x1 + x2 - x3];
  const [dy1, dy2, sy] = [y1 - y2, y3 - y2, y0 - y1 + y2 - y3];
  const scale = dx1 * dy2 - dx2 * dy1;
  const g = (sx * dy2 - dx2 * sy) / scale;
  const h = (dx1 * sy - sx * dy1) / scale;
  const [a, b] = [x1 - x0 + g * x1, x3 - x0 + h * x3];
  const [d, e] = [y1 - y0 + g * y1, y3 - y0 + h * y3];
  return (u, v) => {
    const depth = g * u + h * v + 1;
    return [(a * u + b * v + x0) / depth, (d * u + e * v + y0) / depth];
  };
}

function project(pixels, corners) {
  const toScene = planeMap(corners);
  const rowPx = sceneWidth * drawScale;
  const lastRow = sceneHeight * drawScale - 2;
  const output = Buffer.alloc(widthPx * heightPx * 3);
  for (let y = 0, out = 0; y < heightPx; y += 1) {
    for (let x = 0; x < widthPx; x += 1) {
      const [sceneX, sceneY] = toScene(x / widthPx, y / heightPx);
      const [px, py] = [sceneX * drawScale, Math.min(sceneY * drawScale, lastRow)];
      const [left, top] = [Math.floor(px), Math.floor(py)];
      const [fx, fy] = [px - left, py - top];
      const from = (top * rowPx + left) * 3;
      for (let channel = 0; channel < 3; channel += 1, out += 1) {
        const upper = pixels[from + channel] * (1 - fx) + pixels[from + channel + 3] * fx;
        const below = from + rowPx * 3 + channel;
        const lower = pixels[below] * (1 - fx) + pixels[below + 3] * fx;
        output[out] = upper * (1 - fy) + lower * fy;
      }
    }
  }
  return output;
}

function expose(pixels, soft, { focus, blur, seed, exposure = 1, warmth = 0 }) {
  const random = createRandom(seed);
  const balance = [1 + warmth, 1, 1 - warmth];
  for (let y = 0, index = 0; y < heightPx; y += 1) {
    const v = y / heightPx;
    const blurred = Math.min(1, Math.max(0, (Math.abs(v - focus) - 0.22) * 2.6 * blur));
    for (let x = 0; x < widthPx; x += 1) {
      const u = x / widthPx;
      // one lamp, up and to the left, and the lens's own darkening towards the corners
      const fall = 1.17 - 0.3 * Math.hypot(u - 0.36, (v - 0.3) * 0.8) - 0.32 * ((u - 0.5) ** 2 + (v - 0.5) ** 2);
      const noise = (random.unit() + random.unit() - 1) * 3;
      const grey = (pixels[index] * 0.3 + pixels[index + 1] * 0.59 + pixels[index + 2] * 0.11) * 0.14;
      for (let channel = 0; channel < 3; channel += 1, index += 1) {
        const seen = (pixels[index] * (1 - blurred) + soft[index] * blurred) * 0.86 + grey;
        const lit = ((seen * fall * exposure * balance[channel]) / 255) * 0.97 + 0.018;
        const toned = lit < 1 ? lit + 0.09 * (lit - 0.5) * lit * (1 - lit) * 4 : 1;
        pixels[index] = Math.max(0, Math.min(255, toned * 255 + noise));
      }
    }
  }
}
