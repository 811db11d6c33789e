import { layHeap } from '../shared/arrange.mjs';
import { chipLabels } from '../shared/chip-labels.mjs';
import { gridChip, padGrid } from '../shared/packages.mjs';
import { createRandom } from '../shared/random.mjs';
import { ruler } from '../shared/ruler.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { rectanglePath, svg } from '../shared/svg.mjs';

function ballGrid(random, ballsUp) {
  const size = random.pick([64, 78, 92, 108]);
  const outline = rectanglePath(size, size, 2);
  if (!ballsUp)
    return {
      outline,
      face: gridChip(size, { label: random.pick(chipLabels), top: random.pick([0.8, 0.88, 1]) }).face,
      edge: '#3d5a3d',
      thickness: 3,
    };
  const count = Math.floor(size / 6);
  const hollow = random.chance(0.5);
  const balls = padGrid({
    columns: count,
    rows: count,
    pitch: (size * 0.92) / count,
    radius: 2,
    fill: '#b9bcba',
    glint: '#f4f5f4',
    keep: (_column, _row, ring) => !hollow || ring < 4 || ring > count / 2 - 3,
  });
  return {
    outline,
    face: svg`<path d="${outline}" fill="url(#mask-dark-green)"/>${balls}`,
    edge: '#3d5a3d',
    thickness: 3,
  };
}

/** Whole ball-grid packages, a few showing their balls. */
export function ballGridPackages() {
  const random = createRandom(91);
  const parts = layHeap(random, {
    count: 330,
    width: 1000,
    height: 780,
    make: () => ballGrid(random, random.chance(0.22)),
    lean: 0.8,
  });
  const rule = lay(ruler({ lengthMm: 150, pixelsPerMm: 4.2 }), { x: 640, y: 1070, turn: -3, lift: 'high' });
  return { drawing: svg`${benchTop('steel')}${parts}${rule}`, view: 'bench', seed: 91 };
}
