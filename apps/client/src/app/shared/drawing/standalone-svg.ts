/** What a stylesheet may have given a shape, and a file of its own must carry. */
const PAINT = [
  'fill',
  'fill-opacity',
  'stroke',
  'stroke-opacity',
  'stroke-width',
  'stroke-dasharray',
  'stroke-linecap',
  'opacity',
  'font-family',
  'font-size',
  'font-weight',
  'text-anchor',
  'dominant-baseline',
  'visibility',
  'display',
] as const;

/** A drawing of the page as an SVG file: colours and fonts that the page's styles gave are written into it. */
export function standaloneSvg(drawing: SVGSVGElement): string {
  const copy = drawing.cloneNode(true) as SVGSVGElement;
  const shapes = [drawing, ...drawing.querySelectorAll('*')];
  const copies = [copy, ...copy.querySelectorAll('*')];
  shapes.forEach((shape, at) => paint(shape, copies[at]));
  const { width, height } = drawing.getBoundingClientRect();
  copy.setAttribute('xmlns', 'http://www.w3.org/2000/svg');
  if (!copy.hasAttribute('viewBox')) copy.setAttribute('viewBox', `0 0 ${width} ${height}`);
  copy.setAttribute('width', String(width));
  copy.setAttribute('height', String(height));
  return new XMLSerializer().serializeToString(copy);
}

function paint(shape: Element, copy: Element | undefined): void {
  if (!copy) return;
  const style = getComputedStyle(shape);
  for (const name of PAINT) {
    const value = style.getPropertyValue(name);
    if (value) copy.setAttribute(name, value);
  }
  copy.removeAttribute('style');
  copy.removeAttribute('class');
}
