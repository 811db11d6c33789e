import { layHeap } from '../shared/arrange.mjs';
import { chipLabels } from '../shared/chip-labels.mjs';
import { dualChip, quadChip } from '../shared/packages.mjs';
import { createRandom } from '../shared/random.mjs';
import { benchTop } from '../shared/scene.mjs';
import { rectanglePath, svg } from '../shared/svg.mjs';

function leadedChip(random) {
  const label = random.pick(chipLabels);
  const chip = random.pick([
    () => dualChip(150, 42, { leads: 14, reach: 15, label, colour: 'url(#tin)' }),
    () => dualChip(104, 40, { leads: 8, reach: 14, label, colour: 'url(#tin)' }),
    () => dualChip(78, 44, { leads: 12, reach: 9, label }),
    () => quadChip(84, { leads: 22, reach: 9, label }),
    () => quadChip(62, { leads: 12, reach: 7, label }),
    () => quadChip(104, { leads: 30, reach: 9, label }),
  ])();
  const outline = rectanglePath(chip.width * 0.9, chip.height * 0.8, 2);
  return { outline, face: chip.face, edge: '#1a1b1c', thickness: 5 };
}

/** Leaded plastic chips heaped in a tray. */
export function plasticChips() {
  const random = createRandom(93);
  const parts = layHeap(random, { count: 330, width: 1120, height: 880, make: () => leadedChip(random) });
  return { drawing: svg`${benchTop('paper')}${parts}`, view: 'bench', seed: 93 };
}
