import { memoryModule } from '../shared/memory-module.mjs';
import { createRandom } from '../shared/random.mjs';
import { ruler } from '../shared/ruler.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { svg, times } from '../shared/svg.mjs';

/** Modules laid out in three loose columns, a rule beneath. */
export function memoryRows() {
  const random = createRandom(11);
  const rows = times(30, (index) => {
    const [column, row] = [index % 3, Math.floor(index / 3)];
    const module = memoryModule(476, random);
    return lay(module, {
      x: 262 + column * 536 + random.around(0, 16),
      y: 62 + row * 96 + random.around(0, 7),
      turn: random.around(0, 2.4),
      shade: random.around(0, 0.07),
    });
  });
  const rule = lay(ruler({ lengthMm: 250, pixelsPerMm: 3.75 }), { x: 720, y: 1118, turn: -1.2 });
  return { drawing: svg`${benchTop('steel')}${rows}${rule}`, view: 'bench', seed: 11 };
}

/** One module across the picture, sharp enough to judge its contacts. */
export function memoryClose() {
  const random = createRandom(5);
  const make = { mask: 'green', label: ['VM 12', '1138 K4'], chips: 8, grid: false };
  const module = lay(memoryModule(1480, random, { make, label: true }), { x: 900, y: 500, turn: -5, lift: 'high' });
  const second = lay(memoryModule(1480, random, { make, label: false }), {
    x: 1010,
    y: 170,
    turn: -9,
    lift: 'mid',
    shade: -0.12,
  });
  const rule = lay(ruler({ lengthMm: 110, pixelsPerMm: 11.1, steel: true }), { x: 850, y: 800, turn: -4.4 });
  return { drawing: svg`${benchTop('greyMat')}${second}${module}${rule}`, view: 'close', seed: 5 };
}
