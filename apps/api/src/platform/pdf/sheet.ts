import { createRequire } from 'node:module';
import PDFDocument from 'pdfkit';
import { drawQrCode } from './qr-code.ts';

const require = createRequire(import.meta.url);
const face = (name: string): string => require.resolve(`@expo-google-fonts/ibm-plex-sans/${name}.ttf`);
const regular = face('400Regular/IBMPlexSans_400Regular');
const semiBold = face('600SemiBold/IBMPlexSans_600SemiBold');

const ink = '#1d1b18';
const quiet = '#5c574f';
const rule = '#c9c3b8';
const margin = 56;
const footerGap = 28;
const roomForPart = 110;
const cornerWidth = 110;

export interface Column {
  title: string;
  /** Points, or `*` for a share of what is left. */
  width: number | '*';
  right?: boolean;
}

export interface TableRow {
  cells: string[];
  /** A sum or a result: set bold, under a darker rule. */
  total?: boolean;
}

interface PdfOptions {
  /** Name of the document, for readers that show or speak it. */
  title: string;
  /** Printed at the foot of each page, before the page number. */
  footer: string;
}

const small = { src: regular, size: 8.5 };

const toCells = ({ cells, total = false }: TableRow) =>
  cells.map((text) => ({
    text,
    type: 'TD',
    font: { src: total ? semiBold : regular, size: 10 },
    ...(total ? { borderColor: { top: ink, bottom: rule } } : {}),
  }));

/** A paper of the market while it is drawn: every part is tagged for screen readers, in reading order. */
export class Sheet {
  readonly #doc: PDFKit.PDFDocument;
  readonly #root: PDFKit.PDFStructureElement;
  /** Text above this height leaves room for what stands in the upper right corner. */
  #besideUntil = 0;

  constructor(doc: PDFKit.PDFDocument) {
    this.#doc = doc;
    this.#root = doc.struct('Document') as unknown as PDFKit.PDFStructureElement;
    doc.addStructure(this.#root as never);
  }

  heading(text: string): void {
    this.#write('H1', text, { font: semiBold, size: 20 });
    this.#doc.moveDown(0.3);
  }

  /** Begins a part; on a new page when too little room is left for it to make sense. */
  subheading(text: string): void {
    const { height } = this.#doc.page;
    if (this.#doc.y > height - margin - footerGap - roomForPart) this.#doc.addPage();
    else this.#doc.moveDown(0.9);
    this.#write('H2', text, { font: semiBold, size: 12 });
    this.#doc.moveDown(0.3);
  }

  text(text: string, { small = false } = {}): void {
    this.#write('P', text, { font: regular, size: small ? 8.5 : 10, colour: small ? quiet : ink });
    this.#doc.moveDown(0.2);
  }

  /** A code to scan in the upper right corner; the flow of text is not moved. */
  qrCode(content: string, alt: string): void {
    const doc = this.#doc;
    const size = 88;
    this.#besideUntil = margin + size;
    const figure = doc.struct('Figure', { alt }, () =>
      drawQrCode(doc, { content, x: doc.page.width - margin - size, y: margin, size }),
    );
    this.#root.add(figure as never);
    figure.end();
  }

  table(columns: Column[], rows: TableRow[]): void {
    const head = columns.map(({ title }) => ({ text: title, type: 'TH', textColor: quiet, font: small }));
    this.#draw(columns, [head, ...rows.map(toCells)]);
  }

  /** Names with their values, one a row. */
  facts(pairs: [name: string, value: string][]): void {
    const columns: Pick<Column, 'width'>[] = [{ width: 150 }, { width: '*' }];
    this.#draw(
      columns,
      pairs.map(([name, value]) => [
        { text: name, type: 'TH', textColor: quiet, font: { src: regular, size: 10 } },
        { text: value, type: 'TD', font: { src: regular, size: 10 } },
      ]),
    );
  }

  #draw(columns: Omit<Column, 'title'>[], cells: object[][]): void {
    const options = {
      // Tagged: the row and cell elements are hung below this one.
      structParent: this.#root,
      columnStyles: columns.map(({ width, right = false }) => ({ width, align: { x: right ? 'right' : 'left' } })),
      defaultStyle: {
        border: { top: 0.5, bottom: 0.5, left: 0, right: 0 },
        borderColor: rule,
        padding: { top: 4, bottom: 4, left: 0, right: 8 },
      },
      data: cells,
    };
    this.#doc.font(regular).fontSize(10).fillColor(ink);
    this.#doc.table(options as unknown as PDFKit.Mixins.TableOptionsWithData);
    this.#doc.x = margin;
    this.#doc.moveDown(0.4);
  }

  end(): void {
    this.#root.end();
  }

  #write(
    type: 'H1' | 'H2' | 'P',
    text: string,
    { font, size, colour = ink }: { font: string; size: number; colour?: string },
  ): void {
    const beside = this.#doc.y < this.#besideUntil ? cornerWidth : 0;
    const width = this.#doc.page.width - 2 * margin - beside;
    this.#doc
      .font(font)
      .fontSize(size)
      .fillColor(colour)
      .text(text, margin, this.#doc.y, { width, structParent: this.#root, structType: type });
  }
}

/** Draws a paper on A4, with embedded type, language, title, tags and numbered pages. */
export async function writePdf({ title, footer }: PdfOptions, draw: (sheet: Sheet) => void): Promise<Buffer> {
  const doc = new PDFDocument({
    size: 'A4',
    margins: { top: margin, left: margin, right: margin, bottom: margin + footerGap },
    pdfVersion: '1.7',
    tagged: true,
    lang: 'en-GB',
    displayTitle: true,
    bufferPages: true,
    font: regular,
    info: { Title: title, Creator: 'Lydite', Producer: 'Lydite' },
  });
  const chunks: Buffer[] = [];
  doc.on('data', (chunk: Buffer) => chunks.push(chunk));
  const ended = new Promise<void>((resolve, reject) => doc.on('end', resolve).on('error', reject));
  const sheet = new Sheet(doc);
  draw(sheet);
  sheet.end();
  numberPages(doc, footer);
  doc.end();
  await ended;
  return Buffer.concat(chunks);
}

/** Footers are artefacts: a screen reader leaves them out. */
function numberPages(doc: PDFKit.PDFDocument, footer: string): void {
  const { start, count } = doc.bufferedPageRange();
  for (let page = start; page < start + count; page += 1) {
    doc.switchToPage(page);
    doc.page.margins.bottom = 0;
    doc.markContent('Artifact', { type: 'Pagination' });
    doc
      .font(regular)
      .fontSize(8.5)
      .fillColor(quiet)
      .text(`${footer} · page ${page + 1} of ${count}`, margin, doc.page.height - margin, { lineBreak: false });
    doc.endMarkedContent();
  }
}
