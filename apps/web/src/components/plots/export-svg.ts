const PAINT = [
  'fill',
  'stroke',
  'stroke-width',
  'stroke-dasharray',
  'stroke-opacity',
  'fill-opacity',
  'paint-order',
] as const;
const TYPE = ['font-family', 'font-size', 'font-weight', 'text-anchor'] as const;

/** A picture of a plot that stands alone: colours and type written into it, with its title and a paper ground. */
export function standaloneSvg(source: SVGSVGElement, title: string): string {
  const copy = source.cloneNode(true) as SVGSVGElement;
  const originals = source.querySelectorAll('*');
  copy.querySelectorAll('*').forEach((element, i) => {
    const original = originals[i];
    if (original === undefined) return;
    const style = getComputedStyle(original);
    for (const name of [...PAINT, ...TYPE]) {
      const value = style.getPropertyValue(name);
      if (value !== '') element.setAttribute(name, value);
    }
    element.removeAttribute('class');
  });
  copy.removeAttribute('class');
  copy.removeAttribute('aria-hidden');
  copy.setAttribute('xmlns', 'http://www.w3.org/2000/svg');
  const ground = document.createElementNS('http://www.w3.org/2000/svg', 'rect');
  ground.setAttribute('width', '100%');
  ground.setAttribute('height', '100%');
  ground.setAttribute('fill', getComputedStyle(document.body).backgroundColor || 'white');
  const name = document.createElementNS('http://www.w3.org/2000/svg', 'title');
  name.textContent = title;
  copy.prepend(name, ground);
  return `<?xml version="1.0" encoding="UTF-8"?>\n${new XMLSerializer().serializeToString(copy)}\n`;
}

/** Hands a text to the person as a file. */
export function downloadText(text: string, fileName: string, mediaType: string): void {
  const address = URL.createObjectURL(new Blob([text], { type: `${mediaType};charset=utf-8` }));
  const link = document.createElement('a');
  link.href = address;
  link.download = fileName;
  link.click();
  URL.revokeObjectURL(address);
}

/** 'Axial induction, –' → 'axial-induction'. */
export function fileStem(title: string): string {
  return title
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]+/gu, '-')
    .replace(/^-|-$/gu, '');
}
