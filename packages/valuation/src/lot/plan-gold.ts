import type { FinishComponent, MaterialComponent, Parameter, PlatingComponent } from '../catalogue/catalogue.types.ts';
import { exact } from '../quantity/quantity.ts';
import type { LineInput } from '../types.ts';
import { thicknessQuantity } from './evidence.ts';
import type { Factor, Term } from './lot-plan.types.ts';
import type { Amounts } from './plan-amounts.ts';
import { classFactor, factor, toTerm } from './plan-term.ts';

type Surface = PlatingComponent | FinishComponent;
type Measures = [parameter: string, value: Parameter][];

/** Turns the unit of each figure, as named in the catalogue, into grams of gold; see the functions in ../components. */
const unitOf: Record<string, number> = {
  padAreaMm2: 1e-2,
  thicknessUm: 1e-4,
  lengthMm: 0.1,
  diameterUm: 1e-8 * (Math.PI / 4),
  gradeGPerT: 1e-6,
};
const powerOf: Record<string, number> = { diameterUm: 2 };

/** The gold of one component in a line, or null when its amount cannot be told from what is given. */
export function planGold(
  component: MaterialComponent,
  line: LineInput,
  classCode: string,
  amounts: Amounts,
): Term | null {
  const measures = Object.entries(component.parameters) as Measures;
  const area = isSurface(component) ? measuredAreaCm2(line, component, amounts) : null;
  const kept = area === null ? measures : measures.filter(([parameter]) => !describesArea.has(parameter));
  const perPiece = area !== null || kept.some(([parameter]) => countedByPiece.has(parameter));
  const amount = perPiece ? amounts.pieces : amounts.mass;
  if (!amount) return null;

  const factors = [
    ...amount,
    ...kept.map(([parameter, value]) => toFactor(component, parameter, value, line, classCode)),
  ];
  let constant = kept.reduce((product, [parameter]) => product * (unitOf[parameter] ?? 1), 1);
  if (area !== null) constant *= area;
  if (isSurface(component) && line.wear !== null) constant *= 1 - line.wear;
  return toTerm(component.id, component.name, constant, factors);
}

export function isSurface(component: MaterialComponent): component is Surface {
  return component.kind === 'plating' || component.kind === 'finish';
}

const countedByPiece = new Set(['areaCm2PerPiece', 'contactsPerPiece', 'wiresPerPiece', 'goldGPerPiece']);

/** A measured area is that of the gold itself on one piece, so it stands for all of these. */
const describesArea = new Set([
  'areaCm2PerPiece',
  'areaCm2PerG',
  'contactsPerPiece',
  'padAreaMm2',
  'sides',
  'coveredFraction',
  'share',
]);

/** Gold surface of one piece in cm² as the line gives it; null when the class's own description stands. */
function measuredAreaCm2(line: LineInput, component: Surface, { pieces }: Amounts): number | null {
  if (!pieces) return null;
  if (line.areaCm2PerPiece !== null) return line.areaCm2PerPiece;
  if (line.contactsPerPiece === null || line.padAreaMm2 === null || hasContacts(component)) return null;
  return line.contactsPerPiece * line.padAreaMm2 * 1e-2;
}

export function hasContacts(component: Surface): boolean {
  return component.kind === 'plating' && component.parameters.contactsPerPiece !== undefined;
}

function toFactor(
  component: MaterialComponent,
  parameter: string,
  value: Parameter,
  line: LineInput,
  code: string,
): Factor {
  const name = `${component.id}.${parameter}`;
  const own = { lineId: line.id };
  if (parameter === 'thicknessUm' && line.plating) return factor(own, name, thicknessQuantity(line.plating));
  if (parameter === 'contactsPerPiece' && line.contactsPerPiece !== null) {
    return factor(own, name, exact(line.contactsPerPiece));
  }
  if (parameter === 'padAreaMm2' && line.padAreaMm2 !== null) return factor(own, name, exact(line.padAreaMm2));
  return classFactor(code, name, value, powerOf[parameter] ?? 1);
}
