import type { MaterialClass } from '../catalogue/catalogue.types.ts';
import type { LineInput, Quantity, Warning } from '../types.ts';

/** One uncertain figure in a product, raised to a power. Factors with the same key share their draws. */
export interface Factor {
  key: string;
  /** Name without the line: `massG`, `identity`, `plating.thicknessUm`. */
  parameter: string;
  quantity: Quantity;
  power: number;
}

/** constant · Π factor^power, in grams. Everything known exactly is in the constant. */
export interface Term {
  id: string;
  name: string;
  constant: number;
  factors: Factor[];
}

export interface LinePlan {
  input: LineInput;
  /** "line 2": how messages and questions call it. */
  label: string;
  materialClass: MaterialClass;
  mass: Term | null;
  gold: Term[];
}

/** A lot as a sum of products, ready to be drawn or to be differentiated by parameter. */
export interface LinesPlan {
  lines: LinePlan[];
}

export interface LotPlan extends LinesPlan {
  warnings: Warning[];
}
