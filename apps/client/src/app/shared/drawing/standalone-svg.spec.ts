import { standaloneSvg } from './standalone-svg';

describe('standaloneSvg', () => {
  it('writes the colours of the page into the file and leaves the page alone', () => {
    const svg = document.createElementNS('http://www.w3.org/2000/svg', 'svg');
    const path = document.createElementNS('http://www.w3.org/2000/svg', 'path');
    path.setAttribute('class', 'limit');
    path.setAttribute('style', 'stroke: rgb(178, 64, 42); stroke-width: 1.5px');
    svg.append(path);
    document.body.append(svg);
    const text = standaloneSvg(svg);
    expect(text).toContain('xmlns="http://www.w3.org/2000/svg"');
    expect(text).toContain('stroke="rgb(178, 64, 42)"');
    expect(text).toContain('viewBox="0 0 0 0"');
    expect(text).not.toMatch(/class=|style=/);
    expect(path.getAttribute('class')).toBe('limit');
  });
});
