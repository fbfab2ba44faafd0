import { join } from 'node:path';
import PDFDocument from 'pdfkit';
import { CAPITALS, type Mark, type Sketch } from '@/geometry/sketch/sketch';

/** Points of PDF for a millimetre. */
const POINTS = 72 / 25.4;

const face = (weight: 'regular' | 'semibold'): string =>
  join(process.cwd(), 'fonts', `archivo-${weight}.ttf`);

function draw(document: PDFKit.PDFDocument, mark: Mark): void {
  if (mark.kind === 'fill') {
    document.path(mark.path).fill('#000');
    return;
  }
  if (mark.kind === 'stroke') {
    document.path(mark.path).lineWidth(mark.width);
    if (mark.dash) document.dash(mark.dash[0]!, { space: mark.dash[1] ?? mark.dash[0]! });
    document.stroke('#000');
    document.undash();
    return;
  }
  const { x, y, text, height, anchor, bold, turn } = mark;
  document.font(bold ? 'semibold' : 'regular').fontSize(height / CAPITALS);
  const width = document.widthOfString(text);
  const left = anchor === 'start' ? x : anchor === 'middle' ? x - width / 2 : x - width;
  document.save();
  if (turn) document.rotate(turn, { origin: [x, y] });
  document.fillColor('#000').text(text, left, y, { lineBreak: false, baseline: 'alphabetic' });
  document.restore();
}

/**
 * Sketches as the pages of one PDF, true size, with the lettering's face embedded. The time in it
 * is the one given, so that equal drawings are equal bytes.
 */
export async function sketchesPdf(
  sketches: readonly Sketch[],
  { title, author, issued }: { title: string; author: string; issued: Date },
): Promise<Buffer> {
  const document = new PDFDocument({
    autoFirstPage: false,
    margin: 0,
    info: {
      Title: title,
      Author: author,
      Creator: 'Vaneloft',
      CreationDate: issued,
      ModDate: issued,
    },
  });
  document.registerFont('regular', face('regular'));
  document.registerFont('semibold', face('semibold'));
  const chunks: Buffer[] = [];
  document.on('data', (chunk: Buffer) => chunks.push(chunk));
  const ended = new Promise<void>((resolve, reject) => {
    document.on('end', resolve);
    document.on('error', reject);
  });
  for (const { width, height, marks } of sketches) {
    document.addPage({ size: [width * POINTS, height * POINTS], margin: 0 });
    document.scale(POINTS);
    for (const mark of marks) draw(document, mark);
  }
  document.end();
  await ended;
  return Buffer.concat(chunks);
}
