import { getDocumentProxy, getMeta } from 'unpdf';

interface StructNode {
  role?: string;
  type?: string;
  id?: string;
  children?: StructNode[];
}

interface TextPiece {
  type?: string;
  id?: string;
  str?: string;
}

/** What a reader or a screen reader finds in a PDF: its text in reading order, title, language and the headings by their tags. */
export async function readPdf(bytes: Buffer) {
  const pdf = await getDocumentProxy(new Uint8Array(bytes));
  const { info } = await getMeta(pdf);
  const texts: string[] = [];
  const headings: string[] = [];
  for (let number = 1; number <= pdf.numPages; number += 1) {
    const page = await pdf.getPage(number);
    const { items } = await page.getTextContent({ includeMarkedContent: true });
    const marked = textByMark(items as TextPiece[]);
    texts.push((items as TextPiece[]).map(({ str }) => str ?? '').join(' '));
    headings.push(...headingsOf((await page.getStructTree()) as StructNode, marked));
  }
  const text = texts.join(' ').replaceAll(/[\s\u00a0]+/g, ' ');
  return { text, headings, title: String(info.Title), lang: String(info.Language) };
}

function textByMark(items: TextPiece[]): Map<string, string> {
  const found = new Map<string, string>();
  let current = '';
  for (const { type, id = '', str = '' } of items) {
    if (type === 'beginMarkedContentProps') current = id;
    else if (type === 'endMarkedContent') current = '';
    else if (current) found.set(current, (found.get(current) ?? '') + str);
  }
  return found;
}

function headingsOf(node: StructNode, marked: Map<string, string>): string[] {
  const own = node.children ?? [];
  if (/^H\d$/.test(node.role ?? '')) return [own.map(({ id = '' }) => marked.get(id) ?? '').join('')];
  return own.flatMap((child) => headingsOf(child, marked));
}
