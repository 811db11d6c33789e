import type { Catalogue, MaterialClass } from './catalogue.types.ts';

/** The class with this code. @throws {RangeError} naming the code and the version when the catalogue has none */
export function findClass(catalogue: Catalogue, code: string): MaterialClass {
  const found = catalogue.classes.find((candidate) => candidate.code === code);
  if (!found) throw new RangeError(`classCode "${code}" is not in catalogue ${catalogue.version}`);
  return found;
}
