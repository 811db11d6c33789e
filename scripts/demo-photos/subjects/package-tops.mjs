import { chipLabels } from '../shared/chip-labels.mjs';
import { mouldedBody } from '../shared/packages.mjs';
import { createRandom } from '../shared/random.mjs';
import { ruler } from '../shared/ruler.mjs';
import { benchTop, lay } from '../shared/scene.mjs';
import { at, svg, times } from '../shared/svg.mjs';
import { dish } from '../shared/vessels.mjs';

/** A moulded top pulled off its board: dark above; below, the die's mark and its fan of wires. */
function packageTop(random) {
  const size = random.pick([46, 56, 64]);
  const outline = svg`M${-size / 2} ${-size / 2 + random.between(0, 4)}L${size / 2} ${-size / 2}L${size / 2 - random.between(0, 5)} ${size / 2}H${-size / 2}Z`;
  if (random.chance(0.58))
    return {
      outline,
      face: mouldedBody(size, size, { label: random.pick(chipLabels), tall: 0 }),
      edge: '#111213',
      thickness: 5,
    };
  const wires = times(44, (index) => {
    const angle = (index / 44) * Math.PI * 2;
    const [near, far] = [size * 0.24, size * random.between(0.36, 0.42)];
    return svg`<path d="M${Math.cos(angle) * near} ${Math.sin(angle) * near}L${Math.cos(angle) * far} ${Math.sin(angle) * far}" stroke="${random.pick(['#e7c06a', '#f5dc98', '#c59a45'])}" stroke-width="1.1"/>`;
  });
  return {
    outline,
    face: svg`<path d="${outline}" fill="#3a3a38"/>${wires}<rect x="${-size * 0.2}" y="${-size * 0.2}" width="${size * 0.4}" height="${size * 0.4}" fill="#75797c"/>`,
    edge: '#111213',
    thickness: 5,
  };
}

/** Stripped tops in a steel dish beside a rule. */
export function packageTopsDish() {
  const random = createRandom(92);
  const bowl = dish({ radius: 470 });
  const parts = times(430, (index) => {
    const [angle, reach] = [random.between(0, Math.PI * 2), Math.sqrt(random.unit()) * (index < 300 ? 375 : 270)];
    const depth = index / 430;
    return lay(packageTop(random), {
      x: 800 + Math.cos(angle) * reach,
      y: 530 + Math.sin(angle) * reach - depth * 26,
      turn: random.between(0, 360),
      lean: random.between(0.66, 1),
      shade: -0.3 * (1 - depth) + random.around(0, 0.08),
      lift: 'low',
    });
  });
  const rule = lay(ruler({ lengthMm: 150, pixelsPerMm: 5 }), { x: 760, y: 1090, turn: -1.5 });
  return {
    drawing: svg`${benchTop('wood')}${at(800, 540, bowl.back)}${parts}${at(800, 540, bowl.rim)}${rule}`,
    view: 'bench',
    seed: 92,
    warmth: 0.012,
  };
}
