import { createBoard, edgeContacts, screwHole } from './boards.mjs';
import { header } from './fittings.mjs';
import { at } from './svg.mjs';

/** A wide plug-in board with its edge done: gold contacts, or three pin blocks. The caller adds parts and finishes it. */
export function lineCard(random, { width, height, mask, contacts }) {
  const board = createBoard({ width, height, mask, random, thickness: 6 });
  const edge = height / 2 - 22;
  if (contacts) {
    board.print(at(-width * 0.18, edge, edgeContacts({ width: width * 0.5, tall: 40, pitch: 8.5, random })));
    board.print(at(width * 0.3, edge, edgeContacts({ width: width * 0.26, tall: 40, pitch: 8.5, random })));
    board.reserve(0, edge - 6, width, 58);
  } else {
    for (const x of [-0.3, 0, 0.3]) board.put(header(24, 4, { pitch: 9, fill: '#cfc9b6' }), x * width, edge - 8);
  }
  board.print(at(-width / 2 + 26, -height / 2 + 26, screwHole(9)));
  board.print(at(width / 2 - 26, -height / 2 + 26, screwHole(9)));
  return board;
}
