import type { Parameter } from '../catalogue/catalogue.types.ts';
import type { Quantity } from '../types.ts';
import type { Factor, Term } from './lot-plan.types.ts';

export type Scope = { lineId: string } | { classCode: string };

/** A line's own figure has draws of its own; a class's figure is drawn once for all lines of that class. */
export function factor(scope: Scope, parameter: string, quantity: Quantity, power = 1): Factor {
  const owner = 'lineId' in scope ? `line:${scope.lineId}` : `class:${scope.classCode}`;
  return { key: `${owner}/${parameter}`, parameter, quantity, power };
}

export function classFactor(classCode: string, parameter: string, { quantity }: Parameter, power = 1): Factor {
  return factor({ classCode }, parameter, quantity, power);
}

/** Takes every factor without spread into the constant, so that drawing costs nothing for it. */
export function toTerm(id: string, name: string, constant: number, factors: readonly Factor[]): Term {
  const term: Term = { id, name, constant, factors: [] };
  for (const each of factors) {
    if (each.quantity.kind === 'exact') term.constant *= each.quantity.value ** each.power;
    else term.factors.push(each);
  }
  return term;
}
