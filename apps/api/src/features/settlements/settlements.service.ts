import type { World } from '../../platform/world.ts';
import { statementPdf } from './statement-pdf.ts';

interface OwnDeal {
  dealCode: string;
  memberId: string;
}

/** What the two sides of a deal may ask of its settlement; it is made by the deal itself, see settlements.commands.ts. */
export const createSettlementsService = (world: Pick<World, 'db'>) => ({
  statement: (own: OwnDeal) => statementPdf(world, own),
});
export type SettlementsService = ReturnType<typeof createSettlementsService>;
