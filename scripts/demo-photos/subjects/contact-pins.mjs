import { createRandom } from '../shared/random.mjs';
import { ruler } from '../shared/ruler.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { svg, times } from '../shared/svg.mjs';

function pin(random) {
  const [length, width] = [random.between(62, 130), random.between(6, 9)];
  const gold = random.pick(['gold', 'gold', 'gold-bright', 'gold-dull', 'brass']);
  const [x, y] = [length / 2, width / 2];
  const bent = random.chance(0.3);
  const outline = bent
    ? svg`M${-x} ${-y}H${x * 0.5}L${x * 0.5 + y} ${-y}V${length * 0.26}h${-width}V${y}H${-x}Z`
    : svg`M${-x} ${-y * 0.5}L${3 - x} ${-y}H${x - 6}L${x} ${-y * 0.3}V${y * 0.3}L${x - 6} ${y}H${3 - x}L${-x} ${y * 0.5}Z`;
  const fork =
    !bent && random.chance(0.35)
      ? svg`<rect x="${x * 0.35}" y="-1" width="${x * 0.6}" height="2" fill="#4a3410"/><rect x="${-x * 0.1}" y="${-width * 0.7}" width="${length * 0.1}" height="${width * 1.4}" fill="url(#${gold})"/>`
      : '';
  return { outline, face: svg`<path d="${outline}" fill="url(#${gold})"/>${fork}`, edge: '#6d4d17', thickness: 3 };
}

/** Contact pins, plated all over, heaped on a sheet of paper. */
export function contactPins() {
  const random = createRandom(101);
  const count = 1700;
  const under = svg`<ellipse cx="800" cy="590" rx="430" ry="290" fill="#3a2a0c" opacity=".55" filter="url(#blur-wide)"/>`;
  const pins = times(count, (index) => {
    const depth = index / count;
    const reach = 1 - depth * 0.5;
    return lay(pin(random), {
      x: 800 + random.bell() * 800 * reach,
      y: 580 + random.bell() * 590 * reach - depth * 40,
      turn: random.between(0, 360),
      shade: -0.4 * (1 - depth) + random.around(0, 0.16),
      lift: 'low',
    });
  });
  const rule = lay(ruler({ lengthMm: 150, pixelsPerMm: 5.4, steel: true }), { x: 760, y: 1090, turn: 1 });
  return { drawing: svg`${benchTop('paper')}${under}${pins}${rule}`, view: 'bench', seed: 101 };
}
