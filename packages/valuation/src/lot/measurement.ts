import type { LineEstimate, LineInput, LotInput } from '../types.ts';
import type { Factor, LinePlan } from './lot-plan.types.ts';
import { quantileOf } from '../quantity/quantile.ts';

/** What could be measured to know a figure better. */
export interface Measurement {
  /** "Measure the plating on line 2"; `of` is the line's label or the pieces' name. */
  ask: (of: string) => string;
  /** The line as it would be described had the measurement read what is expected now. */
  improve: (line: LineInput, expected: Expected) => LineInput;
}

interface Expected {
  /** Middle of the figure itself. */
  figure: number;
  massG: number;
  pieces: number;
  gradeGPerT: number;
}

/** Relative sd of laboratory and sampling together in an assay yet to be made. Assumed. */
const expectedAssaySd = 0.1;

const assay: Measurement = {
  ask: (of) => `Have a sample of ${of} assayed`,
  improve: (line, { massG, gradeGPerT }) => ({
    ...line,
    massG: line.massG ?? massG,
    assay: { gradeGPerT, relativeSd: expectedAssaySd },
  }),
};

const weigh: Measurement = {
  ask: (of) => `Weigh ${of}`,
  improve: (line, { massG }) => ({ ...line, massG, massEvidence: 'weighed', scaleResolutionG: massG / 1000 }),
};

const count: Measurement = {
  ask: (of) => `Count the pieces of ${of}`,
  improve: (line, { pieces }) => ({ ...line, pieces, countEvidence: 'counted' }),
};

const inspect: Measurement = {
  ask: (of) => `Have ${of} inspected`,
  improve: (line) => ({ ...line, identityEvidence: 'inspected' }),
};

const measurePlating: Measurement = {
  ask: (of) => `Measure the plating on ${of}`,
  improve: (line, { figure }) => ({ ...line, plating: { kind: 'xrf', thicknessUm: figure } }),
};

const measureArea: Measurement = {
  ask: (of) => `Measure the plated area on ${of}`,
  improve: (line, { figure }) => ({ ...line, areaCm2PerPiece: figure }),
};

const countContacts: Measurement = {
  ask: (of) => `Count the contacts of one piece from ${of}`,
  improve: (line, { figure }) => ({ ...line, contactsPerPiece: figure }),
};

/** The measurement that narrows a figure in a line; an assay where nothing simpler does. */
export function measurementOf({ parameter }: Factor, line: LineInput): Measurement {
  const name = parameter.slice(parameter.indexOf('.') + 1);
  switch (name) {
    case 'massG':
      return line.massEvidence === 'weighed' ? assay : weigh;
    case 'pieces':
      return count;
    case 'pieceMassG':
      return line.pieces === null ? count : weigh;
    case 'identity':
      return line.identityEvidence === 'inspected' ? assay : inspect;
    case 'thicknessUm':
      return line.plating?.kind === 'xrf' ? assay : measurePlating;
    case 'areaCm2PerPiece':
      return measureArea;
    case 'contactsPerPiece':
      return countContacts;
    default:
      return assay;
  }
}

/** What a measurement is supposed to read, by where it lies in what is expected now. */
export type Reading = 'p10' | 'p50' | 'p90';

const probabilityOf: Record<Reading, number> = { p10: 0.1, p50: 0.5, p90: 0.9 };

export interface Improvement {
  measurement: Measurement;
  /** The lines that are measured, and the figure that is. */
  lines: readonly LinePlan[];
  factor: Factor;
  estimates: readonly LineEstimate[];
}

/** The lot as it would be described after the measurement on the given lines. */
export function improveLot(input: LotInput, improvement: Improvement, reading: Reading = 'p50'): LotInput {
  const lines = input.lines.map((line) => {
    const plan = improvement.lines.find((each) => each.input.id === line.id);
    const estimate = improvement.estimates.find(({ id }) => id === line.id);
    if (!plan || !estimate) return line;
    return improvement.measurement.improve(line, expectedOf(plan, estimate, improvement.factor, reading));
  });
  return { lines };
}

function expectedOf(
  { input: line, materialClass: { pieceMassG } }: LinePlan,
  estimate: LineEstimate,
  { parameter, quantity }: Factor,
  reading: Reading,
): Expected {
  const [middle, figure] = [quantileOf(quantity, 0.5), quantileOf(quantity, probabilityOf[reading])];
  const asRead = (what: string) => (parameter === what && middle > 0 ? figure / middle : 1);
  // A mass that was never given is told by the pieces and what one of them weighs.
  const massG = estimate.massG * asRead('massG') * (line.massG === null ? asRead('pieceMassG') : 1);
  const pieces = line.pieces ?? (pieceMassG ? estimate.massG / quantileOf(pieceMassG.quantity, 0.5) : 1);
  return {
    figure,
    massG,
    pieces: (pieces * asRead('pieces')) / (line.pieces === null ? asRead('pieceMassG') : 1),
    gradeGPerT: estimate.gradeGPerT[reading],
  };
}
