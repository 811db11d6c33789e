import QRCode from 'qrcode';

interface QrPlace {
  content: string;
  x: number;
  y: number;
  /** Points. */
  size: number;
}

/** Draws a QR code as shapes, sharp at any print size. */
export function drawQrCode(doc: PDFKit.PDFDocument, { content, x, y, size }: QrPlace): void {
  const { modules } = QRCode.create(content, { errorCorrectionLevel: 'M' });
  const step = size / modules.size;
  for (let row = 0; row < modules.size; row += 1)
    for (let column = 0; column < modules.size; column += 1)
      if (modules.get(row, column)) doc.rect(x + column * step, y + row * step, step, step);
  doc.fill('#000000');
}
