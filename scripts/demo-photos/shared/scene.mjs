import { materials } from './materials.mjs';
import { svg, times } from './svg.mjs';

/** The drawn area, larger than any one view of it. One unit is a scene pixel. */
export const sceneWidth = 1600;
export const sceneHeight = 1200;

/**
 * @typedef {object} Part a drawing centred on its own origin
 * @property {string} outline path of its silhouette
 * @property {string} face what is drawn on it
 * @property {string} [edge] colour of its cut side
 * @property {number} [thickness] height of that side, in scene pixels
 */

/**
 * Lays a part down. The shadow and the thickness always fall the same way, however the part is turned.
 * @param {Part} part
 * @param {object} how
 * @param {number} [how.turn] degrees
 * @param {number} [how.lean] 0 to 1: how much of its depth shows when it lies tilted
 * @param {number} [how.shade] -1 (deep in the heap) to 1 (catching the light)
 * @param {'low' | 'mid' | 'high' | 'none'} [how.lift] how far it stands off what is below
 * @param {number} [how.scale]
 */
export function lay(part, { x, y, turn = 0, lean = 1, shade = 0, lift = 'mid', scale = 1 }) {
  const pose = (drop) => svg`transform="translate(${x} ${y + drop}) rotate(${turn}) scale(${scale} ${scale * lean})"`;
  const steps = Math.ceil((part.thickness ?? 3) / 1.5);
  const side = times(
    steps,
    (step) => svg`<path d="${part.outline}" fill="${part.edge ?? '#20261f'}" ${pose((steps - step) * 1.5)}/>`,
  );
  const light = shade
    ? svg`<path d="${part.outline}" fill="${shade > 0 ? '#fff' : '#04080a'}" opacity="${Math.abs(shade)}"/>`
    : '';
  return svg`<g>${shadow(part.outline, lifts[lift], pose)}${side}<g ${pose(0)}><path d="${part.outline}" fill="${part.edge ?? '#20261f'}"/>${part.face}${light}</g></g>`;
}

/** Rings of shadow: how far each falls, how wide it spreads, how dark it is. */
const rings = (count, reach) =>
  Array.from({ length: count }, (_, index) => {
    const share = (index + 1) / count;
    return [2 + reach * 0.42 * share, 3 + reach * share, 0.62 / (count + index * 1.5)];
  });

const lifts = { none: [], low: rings(3, 11), mid: rings(7, 30), high: rings(10, 60) };

/** Widening outlines instead of a blur filter, which would take minutes for a heap. */
const shadow = (outline, lift, pose) =>
  lift.map(
    ([drop, soft, opacity]) =>
      svg`<g transform="translate(${drop * 0.5} 0)"><path d="${outline}" fill="#05080a" stroke="#05080a" stroke-width="${soft}" stroke-linejoin="round" opacity="${opacity}" ${pose(drop)}/></g>`,
  );

const tops = {
  steel: { colour: '#8f9597', texture: 'brushed', strength: 0.55 },
  darkSteel: { colour: '#5d6367', texture: 'brushed', strength: 0.5 },
  wood: { colour: '#a97f55', texture: 'wood', strength: 0.6 },
  paleWood: { colour: '#c8a97f', texture: 'wood', strength: 0.5 },
  cardboard: { colour: '#b08d62', texture: 'fibrous', strength: 0.45 },
  concrete: { colour: '#8a8986', texture: 'mottled', strength: 0.6 },
  blueMat: { colour: '#3d627c', texture: 'speckled', strength: 0.3 },
  greyMat: { colour: '#7c8286', texture: 'speckled', strength: 0.3 },
  paper: { colour: '#dddad1', texture: 'mottled', strength: 0.2 },
};

/** The thing the goods lie on, filling the whole scene. */
export function benchTop(kind) {
  const { colour, texture, strength } = tops[kind];
  const whole = svg`width="${sceneWidth}" height="${sceneHeight}"`;
  return svg`<rect ${whole} fill="${colour}"/><rect ${whole} filter="url(#${texture})" opacity="${strength}" style="mix-blend-mode:soft-light"/>`;
}

/** A whole scene as an SVG document, drawn at `scale` pixels to a scene pixel. */
export const sceneDocument = (drawing, scale) =>
  svg`<svg xmlns="http://www.w3.org/2000/svg" width="${sceneWidth * scale}" height="${sceneHeight * scale}" viewBox="0 0 ${sceneWidth} ${sceneHeight}">${materials}${drawing}</svg>`;
