import type { DealView, SettlementView } from '@lydite/contracts';
import { AppError } from '../../platform/app-error.ts';
import { marketTerms } from '../../platform/market-terms.ts';
import { writePdf, type Sheet, type TableRow } from '../../platform/pdf/sheet.ts';
import type { FileAnswer } from '../../platform/send-file.ts';
import { createWords, massWords, type Words } from '../../platform/words.ts';
import type { World } from '../../platform/world.ts';
import { dealParties, dealViewOf, nameOf } from '../deals/deals.reads.ts';

/** The settlement statement as the page shows it, figure by figure. @throws AppError deal.wrong_state before the settlement */
export async function statementPdf(
  { db }: Pick<World, 'db'>,
  { dealCode, memberId }: { dealCode: string; memberId: string },
): Promise<FileAnswer> {
  const tx = db.manager;
  const view = await dealViewOf(tx, { code: dealCode, memberId });
  const { settlement } = view;
  if (!settlement) throw new AppError('deal.wrong_state', 'The statement is there once the deal is settled.');
  const parties = (await dealParties(tx, { code: dealCode }))!;
  const [seller, buyer] = [await nameOf(tx, parties.sellerId), await nameOf(tx, parties.buyerId)];
  const words = createWords(await marketTerms(tx));
  const content = await writePdf(
    { title: `Settlement statement ${view.code}`, footer: `Lydite · ${view.code} · record ${settlement.hash}` },
    (sheet) => {
      sheet.heading('Settlement statement');
      sheet.text(`${view.code} · ${view.lotCode}, ${view.title}`);
      sheet.facts([
        ['Seller', `${seller.name}, ${seller.place}`],
        ['Buyer', `${buyer.name}, ${buyer.place}`],
        ['Sale basis', 'Outright: the lot as it stands'],
        ['Settled', words.date(new Date(settlement.settledAt))],
      ]);
      drawMasses(sheet, view);
      drawSteps(sheet, settlement, words);
      sheet.subheading('Chain');
      sheet.table(
        [
          { title: 'Step', width: 140 },
          { title: 'When', width: 140 },
          { title: 'What', width: '*' },
        ],
        view.chain.map(({ title, at, note }) => ({
          cells: [title, at ? words.date(new Date(at)) : 'to come', note],
        })),
      );
      sheet.text('Gold only: other metals go to the buyer and are in the price.', { small: true });
      sheet.text(`SHA-256 of this settlement’s record: ${settlement.hash}`, { small: true });
    },
  );
  return { contentType: 'application/pdf', content, fileName: `statement-${view.code}.pdf`, inline: true };
}

function drawMasses(sheet: Sheet, { weighIn }: DealView): void {
  if (!weighIn) return;
  sheet.subheading('Mass');
  const row = (name: string, massG: number): TableRow => ({ cells: [name, massWords(massG)] });
  sheet.table(
    [
      { title: 'Declared and found', width: '*' },
      { title: 'Mass', width: 120, right: true },
    ],
    [
      row('Declared net', weighIn.declaredG),
      row('Gross, weighed in', weighIn.grossG),
      row('Tare', weighIn.tareG),
      { ...row('Net, weighed in', weighIn.netG), total: true },
      row('Found less declared', weighIn.differenceG),
      row('Weighing tolerance', weighIn.toleranceG),
      { cells: ['Scale', weighIn.scaleSerial || weighIn.note] },
    ],
  );
}

function drawSteps(sheet: Sheet, { sellerSteps, buyerSteps }: SettlementView, { money }: Words): void {
  const sides: [string, SettlementView['sellerSteps']][] = [
    ['From price to seller', sellerSteps],
    ['From hold to buyer', buyerSteps],
  ];
  for (const [title, steps] of sides) {
    sheet.subheading(title);
    sheet.table(
      [
        { title: 'Step', width: 130 },
        { title: 'How', width: '*' },
        { title: 'Amount', width: 90, right: true },
      ],
      steps.map(({ label, detail, amountMinor, total }) => ({ cells: [label, detail, money(amountMinor)], total })),
    );
  }
}
