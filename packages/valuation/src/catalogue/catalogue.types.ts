import type { Quantity } from '../types.ts';

/** A figure of a material class with its spread and where it comes from. */
export interface Parameter {
  quantity: Quantity;
  /** A citation, "modelled: …" (from geometry), "common practice, no source", or "assumed: …". */
  source: string;
}

interface ComponentBase {
  /** Unique within the class; with the parameter's name it makes keys such as `plating.thicknessUm`. */
  id: string;
  /** What holds the gold, in words: "gold contacts". */
  name: string;
}

/** Factor 0 … 1 for the part of the pieces or of the mass that holds this gold at all. */
interface Shared {
  share?: Parameter;
}

/** The plated area is given per piece, per gram, or as contacts times the area of one (both sides counted). */
export interface PlatingComponent extends ComponentBase {
  kind: 'plating';
  parameters: Shared & {
    areaCm2PerPiece?: Parameter;
    areaCm2PerG?: Parameter;
    contactsPerPiece?: Parameter;
    padAreaMm2?: Parameter;
    coveredFraction?: Parameter;
    thicknessUm: Parameter;
    densityGPerCm3: Parameter;
    goldFraction: Parameter;
  };
}

export interface FinishComponent extends ComponentBase {
  kind: 'finish';
  parameters: Shared & {
    areaCm2PerPiece: Parameter;
    sides?: Parameter;
    coveredFraction?: Parameter;
    thicknessUm: Parameter;
    densityGPerCm3: Parameter;
  };
}

export interface BondWireComponent extends ComponentBase {
  kind: 'bondWire';
  parameters: Shared & {
    wiresPerPiece: Parameter;
    lengthMm: Parameter;
    diameterUm: Parameter;
    densityGPerCm3: Parameter;
  };
}

export interface GradeComponent extends ComponentBase {
  kind: 'grade';
  parameters: Shared & { gradeGPerT: Parameter };
}

export interface PerPieceComponent extends ComponentBase {
  kind: 'perPiece';
  parameters: Shared & { goldGPerPiece: Parameter };
}

export type MaterialComponent =
  PlatingComponent | FinishComponent | BondWireComponent | GradeComponent | PerPieceComponent;

/** Classes are shown by how the material is built, in this order. */
export type MaterialGroup = 'edge' | 'boards' | 'processors' | 'chips' | 'pins';

/**
 * A kind of scrap with its own gold model. All spreads are between lots: one draw holds for all pieces of a class in the lot,
 * since what is unknown is the kind of piece and not the scatter among them.
 */
export interface MaterialClass {
  code: string;
  name: string;
  group: MaterialGroup;
  unit: { one: string; many: string };
  /** Caution shown on the lot, whole sentences. */
  hazards: string;
  /** Mass of one piece in grams; null where pieces are too unlike to say. */
  pieceMassG: Parameter | null;
  components: MaterialComponent[];
}

/** Plain JSON; the array's order is the order of display. */
export interface Catalogue {
  version: string;
  classes: MaterialClass[];
}
