import { CAPITALS, type Mark, type Sketch } from './sketch';

export const escaped = (text: string): string =>
  text
    .replace(/&/g, '&amp;')
    .replace(/</g, '&lt;')
    .replace(/>/g, '&gt;')
    .replace(/"/g, '&quot;');

const n = (value: number): string => String(Number(value.toFixed(4)));

function written(mark: Mark): string {
  if (mark.kind === 'fill') return `<path d="${mark.path}" fill="#000"/>`;
  if (mark.kind === 'stroke') {
    const dash = mark.dash ? ` stroke-dasharray="${mark.dash.join(' ')}"` : '';
    return `<path d="${mark.path}" fill="none" stroke="#000" stroke-width="${n(mark.width)}"${dash}/>`;
  }
  const turn = mark.turn
    ? ` transform="rotate(${n(mark.turn)} ${n(mark.x)} ${n(mark.y)})"`
    : '';
  const weight = mark.bold ? ' font-weight="600"' : '';
  return `<text x="${n(mark.x)}" y="${n(mark.y)}" font-size="${n(mark.height / CAPITALS)}" text-anchor="${mark.anchor}"${weight}${turn}>${escaped(mark.text)}</text>`;
}

/** A sketch as SVG of its true size. */
export function sketchSvg({ width, height, marks }: Sketch): string {
  return `<svg xmlns="http://www.w3.org/2000/svg" width="${n(width)}mm" height="${n(height)}mm" viewBox="0 0 ${n(width)} ${n(height)}" font-family="Archivo, Arial, sans-serif">${marks.map(written).join('')}</svg>\n`;
}
