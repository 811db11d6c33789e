import { memoryModule } from '../shared/memory-module.mjs';
import { createRandom } from '../shared/random.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { at, rectanglePath, svg, times } from '../shared/svg.mjs';
import { expansionCard } from './expansion-cards.mjs';
import { driveBoard } from './hard-drive-boards.mjs';
import { phoneBoard } from './phone-boards.mjs';
import { playerBoard } from './player-boards.mjs';
import { powerBoard } from './power-boards.mjs';

const [width, height] = [1360, 1020];
const frame = (inset) => rectanglePath(width - inset * 2, height - inset * 2, 40 - inset * 0.3);

/** Looking down into a crate of unsorted boards. */
export function mixedCrate() {
  const random = createRandom(121);
  const largeBoards = [() => playerBoard(random), () => playerBoard(random), () => powerBoard(random)];
  const smallBoards = [
    () => playerBoard(random),
    () => driveBoard(random),
    () => phoneBoard(random),
    () => memoryModule(420, random),
    () =>
      expansionCard(random, {
        width: random.between(400, 540),
        mask: random.pick(['green', 'blue', 'red', 'dark-green']),
        label: ['AR 7751', '0114'],
      }),
  ];
  const count = 62;
  const boards = times(count, (index) => {
    const depth = index / count;
    const make = random.pick(index < 18 ? largeBoards : smallBoards);
    return lay(make(), {
      x: random.around(0, width / 2 - 190),
      y: random.around(0, height / 2 - 170),
      turn: random.between(0, 360),
      lean: random.between(0.72, 1),
      shade: -0.42 * (1 - depth) + random.around(0, 0.06),
      lift: 'high',
    });
  });
  const walls = svg`<clipPath id="crate-mouth"><path d="${frame(34)}"/></clipPath><path d="${frame(0)}" fill="#000" opacity=".5" transform="translate(14 26)" filter="url(#blur-soft)"/><path d="${frame(0)}" fill="url(#crate-inside)"/>`;
  const gloom = svg`<path d="${frame(34)}" fill="none" stroke="#02060a" stroke-opacity=".75" stroke-width="110" filter="url(#blur-wide)"/>`;
  const rim = svg`<path d="${frame(17)}" fill="none" stroke="#3f678f" stroke-width="40" stroke-linejoin="round"/><path d="${frame(1)}" fill="none" stroke="#7ba0c4" stroke-width="4"/><path d="${frame(36)}" fill="none" stroke="#12202f" stroke-width="6"/>`;
  return {
    drawing: svg`${benchTop('concrete')}${at(800, 600, svg`${walls}<g clip-path="url(#crate-mouth)">${boards}${gloom}</g>${rim}`)}`,
    view: 'overhead',
    seed: 121,
  };
}
