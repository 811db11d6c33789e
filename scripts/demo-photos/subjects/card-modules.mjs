import { raised } from '../shared/packages.mjs';
import { createRandom } from '../shared/random.mjs';
import { ruler } from '../shared/ruler.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { svg, times } from '../shared/svg.mjs';

/** A smart-card contact plate cut out with a rim of its card; every layout is our own. */
function cardModule(random) {
  const [width, height] = [random.between(76, 92), random.between(70, 80)];
  const outline = svg`M${-width / 2} ${-height / 2 + random.between(0, 6)}L${width / 2 - random.between(0, 8)} ${-height / 2}L${width / 2} ${height / 2}L${-width / 2 + random.between(0, 6)} ${height / 2 - random.between(0, 5)}Z`;
  if (random.chance(0.22))
    return {
      outline,
      face: svg`<path d="${outline}" fill="${random.pick(['#d9d5c8', '#2a2d30'])}"/>${raised(width * 0.4, height * 0.42, '#1d1f21', { tall: 2, round: 8 })}`,
      edge: '#c9c6bd',
      thickness: 3,
    };
  const [w, h] = [width * 0.8, height * 0.8];
  const plate = svg`<rect x="${-w / 2}" y="${-h / 2}" width="${w}" height="${h}" rx="9" fill="url(#${random.pick(['gold-lid', 'gold-lid', 'gold-bright'])})"/>`;
  const cuts = random.pick([
    svg`M${-w / 2} ${-h / 6}H${-w * 0.16}M${-w / 2} ${h / 6}H${-w * 0.16}M${w / 2} ${-h / 6}H${w * 0.16}M${w / 2} ${h / 6}H${w * 0.16}M${-w * 0.16} ${-h / 2}V${h / 2}M${w * 0.16} ${-h / 2}V${h / 2}`,
    svg`M${-w / 2} ${-h * 0.22}H${-w * 0.2}L${-w * 0.1} ${-h * 0.32}V${-h / 2}M${-w / 2} ${h * 0.22}H${-w * 0.2}L${-w * 0.1} ${h * 0.32}V${h / 2}M${w / 2} ${-h * 0.22}H${w * 0.2}L${w * 0.1} ${-h * 0.32}V${-h / 2}M${w / 2} ${h * 0.22}H${w * 0.2}L${w * 0.1} ${h * 0.32}V${h / 2}M${-w / 2} 0H${-w * 0.2}M${w * 0.2} 0H${w / 2}`,
  ]);
  return {
    outline,
    face: svg`<path d="${outline}" fill="${random.pick(['#f1efe8', '#e9e4d8', '#c7d4dc', '#eceae4', '#3c4044'])}"/>${plate}<path d="${cuts}" fill="none" stroke="#6f5320" stroke-width="1.8"/>`,
    edge: '#bcb8ac',
    thickness: 3,
  };
}

/** Card modules, cut out, poured on a dark mat. */
export function cardModules() {
  const random = createRandom(103);
  const count = 420;
  const parts = times(count, (index) => {
    const depth = index / count;
    return lay(cardModule(random), {
      x: 800 + random.bell() * 960 * (1 - depth * 0.3),
      y: 570 + random.bell() * 720 * (1 - depth * 0.3),
      turn: random.between(0, 360),
      lean: random.between(0.7, 1),
      shade: -0.32 * (1 - depth) + random.around(0, 0.1),
      lift: 'low',
    });
  });
  const rule = lay(ruler({ lengthMm: 150, pixelsPerMm: 6.4 }), { x: 700, y: 1080, turn: -2, lift: 'high' });
  return { drawing: svg`${benchTop('darkSteel')}${parts}${rule}`, view: 'bench', seed: 103 };
}
