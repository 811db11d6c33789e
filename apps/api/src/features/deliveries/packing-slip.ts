import { AppError } from '../../platform/app-error.ts';
import { writePdf } from '../../platform/pdf/sheet.ts';
import type { FileAnswer } from '../../platform/send-file.ts';
import { massWords } from '../../platform/words.ts';
import type { World } from '../../platform/world.ts';
import { catalogueInForce } from '../catalogue/catalogue.reads.ts';
import { nameOf, ownDeal } from '../deals/deals.reads.ts';
import { lineShares, lotHeadline } from '../lots/lots.reads.ts';

const deferToLaw =
  'These are cautions, not instructions. Local law, permits and licensed practice decide how this material is handled, carried and treated.';

/** The paper that travels with the lot; the seller has it from the hold on. @throws AppError deal.wrong_state before */
export async function packingSlip(
  { db, settings }: Pick<World, 'db' | 'settings'>,
  { dealCode, memberId }: { dealCode: string; memberId: string },
): Promise<FileAnswer> {
  const tx = db.manager;
  const { deal, side } = await ownDeal(tx, { code: dealCode, memberId });
  if (side !== 'seller') throw new AppError('deal.not_found', 'There is no such deal of yours.');
  if (!deal.paidAt || deal.state === 'cancelled')
    throw new AppError('deal.wrong_state', 'The packing slip is there once the deal is paid into hold.');
  const lot = await lotHeadline(tx, deal.lotId);
  const lines = await lineShares(tx, deal.lotId);
  const [seller, buyer] = [await nameOf(tx, deal.sellerId), await nameOf(tx, deal.buyerId)];
  const { classes } = await catalogueInForce(tx);
  const classOf = (code: string) => classes.find((one) => one.code === code);
  const cautions = [...new Set(lines.flatMap(({ classCode }) => classOf(classCode)?.hazards ?? []))];

  const content = await writePdf(
    { title: `Packing slip ${deal.code}`, footer: `Lydite · ${deal.code} · ${lot.code}` },
    (sheet) => {
      sheet.qrCode(`${settings.PUBLIC_URL}/lots/${lot.code}`, `Code to scan: the page of lot ${lot.code}`);
      sheet.heading('Packing slip');
      sheet.text(`Deal ${deal.code}`);
      sheet.text(`Lot ${lot.code}`);
      sheet.text(lot.title);
      sheet.subheading('Parties and delivery');
      sheet.facts([
        ['From', `${seller.name}, ${seller.place}`],
        ['To', `${buyer.name}, ${buyer.place}`],
        [
          'Delivery',
          lot.deliveryWay === 'collection' ? `Collection in ${lot.place}. ${lot.deliveryHours}` : 'Sent by the seller',
        ],
        ...(deal.carrier ? ([['Carrier', `${deal.carrier}, ${deal.trackingCode}`]] satisfies [string, string][]) : []),
      ]);
      sheet.subheading('Contents');
      sheet.table(
        [
          { title: 'Line', width: '*' },
          { title: 'Material class', width: 170 },
          { title: 'Pieces', width: 60, right: true },
          { title: 'Declared net', width: 80, right: true },
        ],
        [
          ...lines.map(({ label, classCode, pieces, massG }) => ({
            cells: [
              label,
              classOf(classCode)?.name ?? classCode,
              pieces === null ? '' : String(pieces),
              massWords(massG),
            ],
          })),
          { cells: ['Declared in all', '', '', massWords(lot.massG)], total: true },
        ],
      );
      sheet.subheading('Handling cautions');
      for (const caution of cautions) sheet.text(caution);
      sheet.text(deferToLaw, { small: true });
    },
  );
  return { contentType: 'application/pdf', content, fileName: `packing-slip-${deal.code}.pdf`, inline: true };
}
