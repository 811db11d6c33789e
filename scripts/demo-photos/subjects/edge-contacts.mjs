import { edgeContacts } from '../shared/boards.mjs';
import { createRandom } from '../shared/random.mjs';
import { ruler } from '../shared/ruler.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { at, svg, times } from '../shared/svg.mjs';

const masks = ['green', 'green', 'green', 'dark-green', 'dark-green', 'blue', 'lime', 'red', 'brown'];

/** A strip cut from a board's edge: an uneven cut above, contacts below. */
function strip(random, size) {
  const [width, height] = [random.between(110, 290) * size, random.between(34, 52) * size];
  const [x, y] = [width / 2, height / 2];
  const jag = () => random.between(-3, 5) * size;
  const outline = svg`M${-x} ${jag() - y}L${-x * 0.3} ${jag() - y}L${x * 0.35} ${jag() - y}L${x} ${jag() - y}V${y}H${-x}Z`;
  const mask = random.pick(masks);
  const tall = height * random.between(0.5, 0.68);
  const key = random.between(0.3, 0.7);
  const pitch = random.pick([6.4, 7.6, 9.4, 12]) * size;
  const contacts = edgeContacts({
    width: width - 6 * size,
    tall,
    pitch,
    gaps: random.chance(0.4) ? [[key, key + 0.06]] : [],
    random,
  });
  const tails = times(
    Math.floor(width / (pitch * 2.4)),
    () =>
      svg`<path d="M${random.around(0, x * 0.9)} ${-y + 3}v${height * 0.3}" stroke="#fff" stroke-opacity=".14" stroke-width="${2 * size}"/>`,
  );
  const face = svg`<path d="${outline}" fill="url(#mask-${mask})"/>${tails}${at(0, y - tall / 2 - size, contacts)}<path d="${outline}" fill="none" stroke="#fff" stroke-opacity=".18" stroke-width="1.5"/>`;
  return { outline, face, edge: '#7f8258', thickness: 4.5 * size };
}

function heap(random, { count, size, centre, spread }) {
  return times(count, (index) => {
    const depth = index / count;
    const reach = 1 - depth * 0.55;
    return lay(strip(random, size), {
      x: centre[0] + random.bell() * spread[0] * reach,
      y: centre[1] + random.bell() * spread[1] * reach - depth * 40,
      turn: random.between(0, 360),
      lean: random.between(0.55, 1),
      shade: -0.42 * (1 - depth) ** 1.5 + random.around(0, 0.13),
      lift: depth > 0.9 ? 'mid' : 'low',
    });
  });
}

/** Trimmed contacts heaped on the bench, a rule in front. */
export function edgeContactsHeap() {
  const random = createRandom(42);
  const under = svg`<ellipse cx="800" cy="580" rx="640" ry="430" fill="#000" opacity=".35" filter="url(#blur-wide)"/>`;
  const strips = heap(random, { count: 520, size: 0.86, centre: [800, 560], spread: [960, 700] });
  const rule = lay(ruler({ lengthMm: 200, pixelsPerMm: 4.6 }), { x: 780, y: 1092, turn: 1.4 });
  return { drawing: svg`${benchTop('steel')}${under}${strips}${rule}`, view: 'bench', seed: 42, warmth: 0.012 };
}

/** The same heap from near, to judge width, wear and colour. */
export function edgeContactsClose() {
  const random = createRandom(43);
  const strips = heap(random, { count: 190, size: 1.7, centre: [800, 600], spread: [1100, 900] });
  const rule = lay(ruler({ lengthMm: 80, pixelsPerMm: 9.2, steel: true }), { x: 760, y: 860, turn: -6, lift: 'high' });
  return { drawing: svg`${benchTop('cardboard')}${strips}${rule}`, view: 'close', seed: 43, warmth: 0.02 };
}
