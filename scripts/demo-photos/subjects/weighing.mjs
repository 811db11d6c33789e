import { memoryModule } from '../shared/memory-module.mjs';
import { createRandom } from '../shared/random.mjs';
import { benchTop, lay, sceneHeight, sceneWidth } from '../shared/scene.mjs';
import { at, mark, rectanglePath, svg, times } from '../shared/svg.mjs';
import { crateFront, scaleHead } from '../shared/vessels.mjs';

/** A wall behind and a bench or floor in front, meeting at `horizon`. */
const room = (wall, ground, horizon) =>
  svg`${benchTop(wall)}<svg y="${horizon}" width="${sceneWidth}" height="${sceneHeight - horizon}" overflow="hidden">${benchTop(ground)}</svg><rect y="${horizon - 6}" width="${sceneWidth}" height="26" opacity=".4" filter="url(#blur-soft)"/>`;

/** A steel platform seen from slightly above, its front at the origin. */
const platform = (width, depth) =>
  svg`<ellipse cx="14" cy="84" rx="${width * 0.56}" ry="46" opacity=".45" filter="url(#blur-soft)"/><path d="M${-width / 2} 0L${-width / 2 + depth * 0.6} ${-depth}H${width / 2 - depth * 0.6}L${width / 2} 0Z" fill="url(#platform)"/><path d="M${-width / 2} 0H${width / 2}V44H${-width / 2}Z" fill="url(#steel)"/><path d="M${-width / 2} 0H${width / 2}V5H${-width / 2}Z" fill="#f4f6f6"/><path d="M${-width / 2 + 30} 44H${width / 2 - 30}V72H${-width / 2 + 30}Z" fill="url(#rubber)"/>${[-1, 1].map((end) => svg`<rect x="${end * width * 0.42 - 34}" y="64" width="68" height="22" rx="8" fill="#17191a"/>`)}`;

/** A crate of memory modules on a bench scale. Its display is left empty: the seed writes each lot's own reading on it. */
export function memoryCrateScale() {
  const random = createRandom(21);
  const crate = crateFront({ width: 880, height: 400 });
  const modules = times(64, (index) => {
    const depth = index / 64;
    return lay(memoryModule(330, random), {
      x: 800 + random.bell() * 440,
      y: 205 + depth * 130 + random.around(0, 26) + Math.abs(random.bell()) * 20,
      turn: random.around(0, 32),
      lean: random.between(0.6, 1),
      shade: -0.3 + depth * 0.34 + random.around(0, 0.05),
      lift: 'low',
    });
  });
  const drawing = svg`${room('concrete', 'darkSteel', 700)}${at(800, 845, platform(1240, 150))}<ellipse cx="810" cy="790" rx="450" ry="34" opacity=".5" filter="url(#blur-soft)"/>${at(800, 390, crate.inside)}${modules}${at(800, 390, crate.front)}${at(800, 1015, scaleHead('', { width: 500 }))}`;
  return { drawing, view: 'front', seed: 21 };
}

const sackOutline =
  'M-330 400C-400 250 -390 20 -300 -180C-270 -250 -180 -300 -90 -320C-60 -328 -50 -350 -70 -400C-90 -450 -60 -470 -10 -462C40 -474 90 -452 74 -402C56 -352 66 -330 98 -320C190 -298 270 -250 304 -176C392 20 402 250 334 400C330 426 250 436 0 438C-250 436 -326 426 -330 400Z';

function sack() {
  const weave = svg`${times(90, (index) => svg`<path d="M${-420 + index * 9.4} -480V450" stroke="#8b7f60" stroke-opacity=".22" stroke-width="1.6"/>`)}${times(100, (index) => svg`<path d="M-420 ${-480 + index * 9.4}H420" stroke="#fff" stroke-opacity=".14" stroke-width="2"/>`)}`;
  const folds = [
    'M-62 -318C-120 -230 -230 -140 -300 40',
    'M-40 -316C-80 -200 -150 -90 -176 90',
    'M-12 -314C-30 -190 -60 -110 -58 30',
    'M16 -314C22 -190 10 -70 40 60',
    'M44 -316C90 -190 120 -80 132 110',
    'M72 -318C150 -230 250 -140 306 50',
    'M-340 300C-220 356 -120 322 -20 372',
    'M350 270C250 330 170 316 96 380',
    'M-250 60C-190 120 -130 110 -90 190',
    'M270 90C220 150 150 150 120 230',
  ].map(
    (path, index) =>
      svg`<path d="${path}" fill="none" stroke="#4b4128" stroke-opacity=".42" stroke-width="${26 - (index % 3) * 6}"/><path d="${path}" fill="none" stroke="#fffbe8" stroke-opacity=".5" stroke-width="12" transform="translate(-22 -4)"/>`,
  );
  const bulges = [
    [-180, 140, 70],
    [-40, 40, 80],
    [120, 110, 76],
    [210, 250, 62],
    [-230, 280, 60],
    [10, 250, 84],
  ].map(
    ([x, y, r]) =>
      svg`<ellipse cx="${x}" cy="${y}" rx="${r}" ry="${r * 0.7}" fill="#fff7dc" opacity=".34"/><path d="M${x - r} ${y + r * 0.6}Q${x} ${y + r * 1.2} ${x + r} ${y + r * 0.5}" fill="none" stroke="#4b4128" stroke-opacity=".42" stroke-width="14"/>`,
  );
  const round = svg`<path d="${sackOutline}" fill="none" stroke="#2e2714" stroke-opacity=".8" stroke-width="110" filter="url(#blur-wide)"/>`;
  const tie = svg`<path d="M-72 -336Q0 -312 78 -336" fill="none" stroke="#262321" stroke-width="15" stroke-linecap="round"/><path d="M-70 -348Q0 -326 76 -348" fill="none" stroke="#3b3733" stroke-width="9"/>`;
  const tag = svg`<g transform="translate(118 -232) rotate(9)"><path d="M-6 -96L2 -40" stroke="#3b3733" stroke-width="4"/><path d="${rectanglePath(150, 92, 10)}" fill="#000" opacity=".3" transform="translate(5 9)"/><path d="${rectanglePath(150, 92, 10)}" fill="#e8dcb9"/><path d="M-56 -14h112M-56 8h112M-56 30h112" stroke="#86795a" stroke-width="2"/></g>`;
  return svg`<clipPath id="sack"><path d="${sackOutline}"/></clipPath><path d="${sackOutline}" fill="url(#weave)"/><g clip-path="url(#sack)">${weave}<g filter="url(#blur-soft)">${bulges}${folds}</g>${round}</g>${tie}${tag}`;
}

/** A sack on a floor scale, the head on its post. Its display is left empty: the seed writes each lot's own reading on it. */
export function sackFloorScale() {
  const drawing = svg`${room('paper', 'concrete', 520)}<rect x="1176" y="300" width="44" height="600" fill="url(#tin)"/>${at(760, 1010, platform(1180, 210))}<ellipse cx="670" cy="945" rx="370" ry="40" opacity=".55" filter="url(#blur-soft)"/>${svg`<g transform="translate(640 548) scale(.94)">${sack()}</g>`}${at(1250, 250, scaleHead('', { width: 520 }))}`;
  return { drawing, view: 'front', seed: 22 };
}

const ticketLines = [
  ['Ticket', '004 817'],
  ['Counter', '2'],
  ['Scale', 'No. 6  60 kg × 10 g'],
  ['Seal', '118'],
];

/** A weigh ticket of an invented public scale, on a clipboard. */
export function weighTicket() {
  const ink = '#2e3036';
  const outline = svg`M-270 -500H270V512${times(29, (index) => svg`L${270 - (index + 0.5) * 18.6} ${index % 2 ? 522 : 508}`)}L-270 512Z`;
  const row = (y, left, right, size = 27, weight = 400) =>
    svg`<text x="-226" y="${y}" font-size="${size}" font-weight="${weight}">${left}</text><text x="226" y="${y}" font-size="${size}" font-weight="${weight}" text-anchor="end">${right}</text>`;
  const text = svg`<g font-family="DejaVu Sans Mono, monospace" fill="${ink}" xml:space="preserve">${mark(0, -420, 36, 'WENDLESEA', ink, 'font-weight="700"')}${mark(0, -378, 36, 'PUBLIC SCALE', ink, 'font-weight="700"')}${mark(0, -338, 22, 'Quay road, Pellandsea', ink)}<path d="M-226 -308H226" stroke="${ink}" stroke-width="2.5" stroke-dasharray="9 6"/>${ticketLines.map(([left, right], index) => row(-256 + index * 42, left, right))}<path d="M-226 -96H226" stroke="${ink}" stroke-width="2.5" stroke-dasharray="9 6"/>${row(-36, 'GROSS', '31.46 kg', 38)}${row(24, 'TARE', '0.38 kg', 38)}<path d="M0 46H226" stroke="${ink}" stroke-width="3"/>${row(98, 'NET', '31.08 kg', 44, 700)}<path d="M-226 140H226" stroke="${ink}" stroke-width="2.5" stroke-dasharray="9 6"/>${row(192, 'Goods', 'boards, bag 3')}${row(234, 'Weigher', 'M. T.')}${mark(0, 470, 19, 'Keep this ticket with the goods', ink)}</g>`;
  const bars = times(
    46,
    (index) =>
      svg`<rect x="${-200 + index * 8.8}" y="290" width="${[2, 5, 3, 6, 2, 4][(index * 7) % 6]}" height="120" fill="${ink}"/>`,
  );
  const pen = svg`<path d="M-190 318C-150 270 -130 372 -96 316C-70 272 -60 366 -24 322C6 290 20 344 92 306" transform="translate(60 -62)" fill="none" stroke="#24418a" stroke-width="4.5" stroke-linecap="round" opacity=".85"/>`;
  const crease = svg`<path d="M-270 40H270" stroke="#000" stroke-opacity=".12" stroke-width="3"/><path d="M-270 44H270" stroke="#fff" stroke-opacity=".7" stroke-width="3"/><path d="M-270 -500H-120L-220 520H-270Z" fill="#000" opacity=".035"/>`;
  const ticket = lay(
    {
      outline,
      face: svg`<path d="${outline}" fill="url(#paper)"/>${text}${bars}${pen}${crease}`,
      edge: '#cfcbbd',
      thickness: 2,
    },
    { x: 800, y: 610, turn: -4, lift: 'high' },
  );
  const clip = at(
    790,
    108,
    svg`<path d="${rectanglePath(330, 76, 16)}" fill="#000" opacity=".4" transform="translate(6 12)"/><path d="${rectanglePath(330, 76, 16)}" fill="url(#steel-bright)"/><path d="M-60 -38V-70H60V-38" fill="url(#steel)"/><rect x="-165" y="22" width="330" height="6" fill="#6c7274"/>`,
    -4,
  );
  const boardPart = {
    outline: rectanglePath(860, 1240, 26),
    face: svg`<path d="${rectanglePath(860, 1240, 26)}" fill="#7d5a38"/><path d="${rectanglePath(860, 1240, 26)}" fill="#fff" opacity=".06"/>`,
    edge: '#513820',
    thickness: 8,
  };
  return {
    drawing: svg`${benchTop('greyMat')}${lay(boardPart, { x: 800, y: 640, turn: -4, lift: 'high' })}${ticket}${clip}`,
    view: 'overhead',
    seed: 23,
    warmth: 0.01,
  };
}
