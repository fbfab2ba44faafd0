/** Hands an SVG to the browser to be saved. */
export function saveSvg(svg: string, name: string): void {
  const address = URL.createObjectURL(new Blob([svg], { type: 'image/svg+xml' }));
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), 60_000);
}
