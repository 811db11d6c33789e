import { requireBetween } from '../argument.ts';

/**
 * Gold in pieces that hold a known amount each: pieces · goldGPerPiece.
 * @param counted number of pieces (≥ 0) and grams of gold in one (≥ 0)
 * @returns grams of gold
 * @throws {RangeError} naming the argument that is not finite or outside its range
 */
export function pieceGold({ pieces, goldGPerPiece }: { pieces: number; goldGPerPiece: number }): number {
  requireBetween('pieces', pieces, 0);
  requireBetween('goldGPerPiece', goldGPerPiece, 0);
  return pieces * goldGPerPiece;
}
