import { lay } from './scene.mjs';
import { svg, times } from './svg.mjs';

/** Lays a rough grid of parts, each made by `make(index)`. */
export function layGrid(random, { columns, rows, left, top, pitch, loose, turn, make }) {
  return times(columns * rows, (index) =>
    lay(make(index), {
      x: left + (index % columns) * pitch + random.around(0, loose),
      y: top + Math.floor(index / columns) * pitch + random.around(0, loose),
      turn: random.around(0, turn) + random.pick([0, 0, 90, 180]),
      shade: random.around(0, 0.07),
      lift: 'mid',
    }),
  );
}

export const bevel = (outline) =>
  svg`<path d="${outline}" fill="none" stroke="#fff" stroke-opacity=".28" stroke-width="2"/>`;

/** Spreads parts in a heap around the middle of the scene, the lower ones darker. */
export function layHeap(random, { count, width, height, centre = [800, 600], make, lean = 0.72 }) {
  return times(count, (index) => {
    const depth = index / count;
    const reach = 1 - depth * 0.3;
    return lay(make(index), {
      x: centre[0] + random.bell() * width * reach,
      y: centre[1] + random.bell() * height * reach,
      turn: random.between(0, 360),
      lean: random.between(lean, 1),
      shade: -0.34 * (1 - depth) + random.around(0, 0.09),
      lift: 'low',
    });
  });
}
