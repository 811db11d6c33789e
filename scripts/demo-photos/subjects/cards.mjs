import { createBoard, edgeContacts, passive, screwHole } from '../shared/boards.mjs';
import { canCapacitor, choke, crystal, header, heatSink, portBlock } from '../shared/fittings.mjs';
import { barLabel, dualChip, gridChip, quadChip } from '../shared/packages.mjs';
import { createRandom } from '../shared/random.mjs';
import { ruler } from '../shared/ruler.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { at, box, svg, times } from '../shared/svg.mjs';

/** An expansion card: contacts below, a steel bracket on its left. */
function expansionCard(random, { width, mask, label }) {
  const height = 230;
  const tongue = width * 0.62;
  const left = -width * 0.3;
  const outline = svg`M${-width / 2} ${-height / 2}H${width / 2}V${height / 2 - 34}H${left + tongue}V${height / 2}H${left}V${height / 2 - 34}H${-width / 2}Z`;
  const board = createBoard({ width, height, mask, random, outline });
  board.print(
    at(
      left + tongue / 2,
      height / 2 - 16,
      edgeContacts({ width: tongue - 8, tall: 28, pitch: 8, gaps: [[0.2, 0.26]], random }),
    ),
  );
  board.reserve(0, height / 2 - 20, width, 46);
  board.put(portBlock(40, [46, 46], { fill: 'url(#steel-bright)' }), -width / 2 + 22, -20);
  if (random.chance(0.5)) board.put(heatSink(92, 92), 10, -30);
  else board.put(quadChip(random.between(60, 84), { label, leads: 26 }), 10, -30);
  board.scatter(random.whole(4, 8), () =>
    random.pick([dualChip(52, 26, { leads: 12, label }), gridChip(40, { label })]),
  );
  board.scatter(6, () => canCapacitor(10));
  board.scatter(5, () => random.pick([dualChip(28, 18, { leads: 6 }), crystal(24), choke(24)]));
  board.scatter(110, () => passive(random), { gap: 1.5, tries: 5 });
  const part = board.finish();
  const bracket = at(
    -width / 2 - 8,
    0,
    svg`${box(15, height + 44, 'url(#steel-bright)')}<rect x="5" y="${-height / 2 - 22}" width="3" height="${height + 44}" fill="#7c8284"/>`,
  );
  return { ...part, face: svg`${part.face}${random.chance(0.6) ? bracket : ''}` };
}

/** Expansion cards spread on a mat. */
export function expansionCards() {
  const random = createRandom(71);
  const masks = [
    'green',
    'dark-green',
    'lime',
    'red',
    'green',
    'blue',
    'brown',
    'black',
    'green',
    'green',
    'dark-green',
    'blue',
    'lime',
  ];
  const labels = [
    ['VEL 40', '9827'],
    ['AR 7751', '0114'],
    ['NK 310', '0336'],
  ];
  const cards = masks.map((mask, index) =>
    lay(expansionCard(random, { width: random.between(400, 560), mask, label: random.pick(labels) }), {
      x: 290 + (index % 3) * 510 + random.around(0, 40),
      y: 150 + Math.floor(index / 3) * 238 + random.around(0, 22),
      turn: random.around(0, 10) + (index % 5 === 3 ? 180 : 0),
      shade: random.around(0, 0.06),
      lift: 'high',
    }),
  );
  return { drawing: svg`${benchTop('cardboard')}${cards}`, view: 'bench', seed: 71, warmth: 0.015 };
}

function lineCard(random, { width, height, mask, contacts }) {
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

/** One telecom line card, gold from edge to edge. */
export function telecomCard() {
  const random = createRandom(31);
  const [width, height] = [1240, 880];
  const board = lineCard(random, { width, height, mask: 'green', contacts: true });
  for (let index = 0; index < 4; index += 1) {
    const package_ = { width: 128, height: 128, face: goldLidPackage(118) };
    board.put(package_, -420 + index * 270, -250);
  }
  for (let row = 0; row < 3; row += 1)
    for (let index = 0; index < 8; index += 1)
      board.put(
        dualChip(106, 40, { label: ['QV 88', '8947 C2'], leads: 12, colour: 'url(#gold)' }),
        -500 + index * 142,
        -90 + row * 92,
      );
  for (let index = 0; index < 3; index += 1)
    board.put(
      quadChip(100, { label: ['QV 4400', '9102'], leads: 30, colour: 'url(#gold-bright)' }),
      -380 + index * 360,
      250,
    );
  board.put(header(32, 3, { pitch: 11, fill: '#cfc9b6' }), 380, -390);
  board.scatter(30, () =>
    random.pick([dualChip(56, 26, { label: ['QV 21', '8951'], leads: 8 }), crystal(34), canCapacitor(13)]),
  );
  board.scatter(260, () => passive(random, 1.3), { gap: 2, tries: 5 });
  const card = lay(board.finish(), { x: 800, y: 590, turn: -3, lift: 'high' });
  const rule = lay(ruler({ lengthMm: 250, pixelsPerMm: 4.2, steel: true }), { x: 800, y: 1110, turn: -2.2 });
  return { drawing: svg`${benchTop('darkSteel')}${card}${rule}`, view: 'overhead', seed: 31 };
}

/** A pale ceramic package under a gold lid. */
const goldLidPackage = (size) =>
  svg`<rect x="${-size / 2 + 4}" y="${-size / 2 + 7}" width="${size}" height="${size}" opacity=".4"/>${box(size, size, 'url(#ceramic-violet)')}${box(size * 0.6, size * 0.6, 'url(#gold-lid)', 'stroke="#8b6a2b" stroke-width="2"')}${times(4, (side) => svg`<g transform="rotate(${side * 90})">${times(14, (index) => svg`<rect x="${size * (-0.45 + index * 0.066)}" y="${-size * 0.545}" width="${size * 0.036}" height="${size * 0.07}" fill="url(#gold-bright)"/>`)}</g>`)}`;

/** Boards out of network switches and routers. */
export function networkBoards() {
  const random = createRandom(73);
  const layouts = [
    [420, 330, 6, 'green', false],
    [1190, 300, -5, 'blue', true],
    [330, 820, -4, 'dark-green', true],
    [1080, 800, 4, 'green', false],
  ];
  const boards = layouts.map(([x, y, turn, mask, contacts]) => {
    const [width, height] = [820, 500];
    const board = lineCard(random, { width, height, mask, contacts });
    for (let index = 0; index < 8; index += 1) board.put(jack(), -width / 2 + 110 + index * 62, -height / 2 + 38);
    board.put(heatSink(104, 104, { fins: 9 }), -180, 10);
    board.put(heatSink(80, 80, { fins: 7, fill: '#2c2f31', dark: '#111' }), 40, 20);
    board.put(gridChip(74, { label: ['HB 5300', '0922'] }), 180, 0);
    for (let index = 0; index < 4; index += 1)
      board.put(dualChip(70, 30, { label: ['VM 09', '0908'], leads: 16 }), 310, -60 + index * 46);
    for (let index = 0; index < 4; index += 1)
      board.put(dualChip(58, 40, { leads: 10, label: ['LT 24', '0911'] }), -width / 2 + 140 + index * 124, -150);
    board.scatter(10, () => canCapacitor(13));
    board.scatter(18, () => random.pick([dualChip(40, 22, { leads: 8 }), crystal(26), choke(30)]));
    board.scatter(200, () => passive(random), { gap: 1.5, tries: 5 });
    const part = board.finish();
    const sticker = at(-340, 60, barLabel(90, 54, random), 90);
    return lay(
      { ...part, face: svg`${part.face}${sticker}` },
      { x, y, turn, lift: 'high', shade: random.around(-0.03, 0.05) },
    );
  });
  return { drawing: svg`${benchTop('concrete')}${boards}`, view: 'bench', seed: 73 };
}

/** A shielded network jack seen from above. */
const jack = () => ({
  width: 58,
  height: 72,
  face: svg`<rect x="-24" y="-28" width="56" height="72" opacity=".4"/>${box(56, 72, 'url(#steel-bright)', 'rx="2"')}<rect x="-28" y="-36" width="56" height="9" fill="#1a1c1d"/><rect x="-10" y="-6" width="20" height="5" fill="#858b8d"/><path d="M-22 20h44" stroke="#8d9395" stroke-width="1.5"/>`,
});
