import { passive, screwHole } from './boards.mjs';
import { crystal } from './fittings.mjs';
import { dualChip, quadChip } from './packages.mjs';
import { at } from './svg.mjs';

/** Fills what is left of a board with chips and small parts. */
export function fillBoard(board, random, { chips, small, label }) {
  board.scatter(chips, () =>
    random.pick([
      () => dualChip(30, 20, { leads: 7 }),
      () => dualChip(46, 24, { leads: 10, label }),
      () => quadChip(40, { label, leads: 14 }),
      () => crystal(24),
    ])(),
  );
  board.scatter(small, () => passive(random, 1.15), { gap: 1.5, tries: 5 });
}

export const drillCorners = (board, width, height) => {
  for (const [x, y] of [
    [-1, -1],
    [1, -1],
    [-1, 1],
    [1, 1],
  ]) {
    board.print(at(x * (width / 2 - 18), y * (height / 2 - 18), screwHole(7)));
    board.reserve(x * (width / 2 - 18), y * (height / 2 - 18), 34, 34);
  }
};
