import type { SaleForm } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import { estimateOf } from '../estimates/estimates.reads.ts';
import { Lot, LotLine, type LotState } from './lot.entity.ts';

export interface LotHeadline {
  id: string;
  code: string;
  title: string;
  state: LotState;
  form: SaleForm;
  sellerId: string;
  /** Declared net mass, grams. */
  massG: number;
  massEvidence: 'stated' | 'weighed';
  pieces: number | null;
  place: string;
  country: string;
  coverPhotoId: string | null;
  deliveryWay: 'seller-sends' | 'collection';
  deliveryHours: string;
  freightMinor: number;
  listedAt: Date;
  closesAt: Date;
}

/** What a deal's pages say of its lot. @throws when the lot was never listed */
export async function lotHeadline(tx: EntityManager, lotId: string): Promise<LotHeadline> {
  const lot = await tx.findOneByOrFail(Lot, { id: lotId });
  if (!lot.listedAt) throw new Error(`Lot ${lot.code} was never listed`);
  return {
    id: lot.id,
    code: lot.code,
    title: lot.title!,
    state: lot.state,
    form: lot.form!,
    sellerId: lot.sellerId,
    massG: lot.massG!,
    massEvidence: lot.massEvidence!,
    pieces: lot.pieces,
    place: lot.place!,
    country: lot.country!,
    coverPhotoId: lot.coverPhotoId,
    deliveryWay: lot.deliveryWay!,
    deliveryHours: lot.deliveryHours!,
    freightMinor: lot.freightMinor!,
    listedAt: lot.listedAt,
    closesAt: lot.closesAt!,
  };
}

export interface LineShare {
  id: string;
  label: string;
  classCode: string;
  /** Declared net mass, grams. */
  massG: number;
  pieces: number | null;
  /** The line's share of the lot's expected gold in the frozen estimate; the shares of a lot add up to 1. */
  massShareOfGold: number;
}

/** The lines of a listed lot with their shares of its gold, in order. */
export async function lineShares(tx: EntityManager, lotId: string): Promise<LineShare[]> {
  const lines = await tx.find(LotLine, { where: { lotId }, order: { position: 'ASC' } });
  const estimate = await estimateOf(tx, lotId);
  if (!estimate) throw new Error(`Lot ${lotId} has no estimate`);
  const goldG = (id: string): number => estimate.result.lines.find((line) => line.id === id)!.goldG.mean;
  const totalG = lines.reduce((sum, line) => sum + goldG(line.id), 0);
  return lines.map(({ id, label, classCode, massG, pieces }) => ({
    id,
    label,
    classCode,
    massG: massG!,
    pieces,
    // A lot without any gold is shared equally, so that its shares still add up to 1.
    massShareOfGold: totalG > 0 ? goldG(id) / totalG : 1 / lines.length,
  }));
}
