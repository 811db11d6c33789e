import type { Quantity, Warning } from '../types.ts';
import { quantileOf } from '../quantity/quantile.ts';
import { roundSignificant } from '../round-significant.ts';
import { platingStandards } from '../units/plating-standards.ts';
import { massQuantity, thicknessQuantity } from './evidence.ts';
import { isUsualPieceMass, likelyMassG } from './likely-mass.ts';
import type { LinePlan } from './lot-plan.types.ts';
import { hasContacts, isSurface } from './plan-gold.ts';

const thickestStandardUm = Math.max(...platingStandards.map(({ minimumUm }) => minimumUm));

type Check = (plan: LinePlan) => { code: string; message: string } | null;

/** What is implausible or missing in a line; each can be overridden by the person who knows better, none stops the estimate. */
export function warningsOf(plan: LinePlan): Warning[] {
  return checks.flatMap((check) => {
    const found = check(plan);
    return found ? [{ ...found, lineId: plan.input.id }] : [];
  });
}

const amountMissing: Check = ({ input, label, mass, gold, materialClass }) => {
  if (input.massG === null && input.pieces === null) {
    return { code: 'nothing-given', message: `Give the mass or the number of pieces of ${label}` };
  }
  const components = input.assay ? 1 : materialClass.components.length;
  if (mass && gold.length === components) return null;
  const needed = mass ? 'number of pieces' : 'mass';
  return {
    code: 'amount-needed',
    message: `Give the ${needed} of ${label}: pieces of this kind are too unlike to tell it`,
  };
};

const massPerPiece: Check = ({ input: { massG, pieces, pieceMassG }, materialClass }) => {
  const prior = materialClass.pieceMassG?.quantity;
  if (!massG || !pieces || pieceMassG !== null || prior?.kind !== 'lognormal') return null;
  if (isUsualPieceMass(massG / pieces, materialClass)) return null;
  const [least, most] = [prior.median / prior.gsd ** 2, prior.median * prior.gsd ** 2].map(inGrams);
  const slip = likelyMassG({ massG, pieces }, materialClass);
  const instead = slip ? ` ${inWords(slip)} would be ${inWords(slip / pieces)} each.` : '';
  const kind = capital(materialClass.unit.many);
  return {
    code: 'mass-per-piece',
    message: `${inWords(massG)} for ${pieces} pieces is ${inWords(massG / pieces)} each. ${kind} mostly weigh ${least} to ${most} g.${instead}`,
  };
};

const platingThick: Check = ({ input: { plating }, label, materialClass }) => {
  const prior = thicknessPrior(materialClass.components);
  if (!plating || !prior) return null;
  const stated = thicknessQuantity(plating);
  const thickest = quantileOf(stated, 0.5);
  const words = `${roundSignificant(thickest, 2)} µm`;
  if (thickest > thickestStandardUm) {
    return {
      code: 'plating-beyond-standards',
      message: `${words} on ${label} is thicker than any standard class. Was it micro-inches?`,
    };
  }
  if (thickest === 0 || thickest <= quantileOf(prior, 0.9985)) return null;
  return {
    code: 'plating-thick',
    message: `${words} on ${label} is more than ${materialClass.unit.many} carry. Was it micro-inches?`,
  };
};

const rangeWide: Check = ({ input: { plating }, label, materialClass }) => {
  const prior = thicknessPrior(materialClass.components);
  if (!plating || !prior || relativeRange(thicknessQuantity(plating)) <= relativeRange(prior)) return null;
  return {
    code: 'range-wider-than-class',
    message: `The plating given for ${label} is a wider range than its kind has anyway`,
  };
};

const scaleCoarse: Check = ({ input, label }) => {
  if (input.massG === null || input.massEvidence === 'stated') return null;
  const stated = massQuantity(input.massG, { ...input, massEvidence: 'stated' });
  if (relativeRange(massQuantity(input.massG, input)) <= relativeRange(stated)) return null;
  return {
    code: 'scale-too-coarse',
    message: `The scale used for ${label} is too coarse for this mass: a stated mass is taken as closer`,
  };
};

const figureUnused: Check = ({ input, label, materialClass, gold }) => {
  const surface = materialClass.components.find(isSurface);
  const given = input.plating ?? input.wear ?? input.areaCm2PerPiece ?? input.contactsPerPiece ?? input.padAreaMm2;
  if (given === null || input.assay) return null;
  if (!surface) {
    return {
      code: 'plating-unused',
      message: `The gold of ${label} is told by its grade, so the plating given is not used`,
    };
  }
  const halves = [input.contactsPerPiece, input.padAreaMm2].filter((half) => half !== null).length;
  if (input.areaCm2PerPiece === null && halves === 1 && !hasContacts(surface)) {
    const missing = input.padAreaMm2 === null ? 'area of one contact' : 'number of contacts';
    return {
      code: 'area-incomplete',
      message: `Give the ${missing} on ${label} too: one alone does not tell the plated area`,
    };
  }
  const needsPieces = input.areaCm2PerPiece !== null || halves === 2;
  const hasPieces = input.pieces !== null || input.pieceMassG !== null || materialClass.pieceMassG !== null;
  if (!needsPieces || hasPieces || gold.length === 0) return null;
  return {
    code: 'pieces-needed',
    message: `Give the number of pieces of ${label}: the area of one piece is not used without it`,
  };
};

const checks = [amountMissing, massPerPiece, platingThick, rangeWide, scaleCoarse, figureUnused];

function thicknessPrior(components: LinePlan['materialClass']['components']): Quantity | undefined {
  return components.find(isSurface)?.parameters.thicknessUm.quantity;
}

/** p90/p10; 1 for a quantity that is 0 throughout, infinite when only its p10 is 0. */
function relativeRange(quantity: Quantity): number {
  const [low, high] = [quantileOf(quantity, 0.1), quantileOf(quantity, 0.9)];
  return high === 0 ? 1 : high / low;
}

const inGrams = (massG: number) => roundSignificant(massG, 2);
const inWords = (massG: number) =>
  massG < 1000 ? `${roundSignificant(massG, 3)} g` : `${roundSignificant(massG / 1000, 3)} kg`;
const capital = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);
