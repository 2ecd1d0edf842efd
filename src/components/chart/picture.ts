/**
 * A chart on screen as a picture that stands by itself: colours written out, its finding
 * on top, what has to be said of its data below. Thousands of dots on a canvas become an
 * image within the SVG.
 */
import { textWidth } from '../text-width.ts';

const COPIED = [
  'fill',
  'fill-opacity',
  'stroke',
  'stroke-width',
  'stroke-dasharray',
  'opacity',
  'font-size',
  'font-weight',
  'text-anchor',
  'paint-order',
] as const;
const LINE = 22;
const PAD = 16;
const FONT = 'Atkinson Hyperlegible, Liberation Sans, Arial, sans-serif';
/** Pixels of a PNG for each of the chart's: sharp when printed. */
const DENSITY = 2;
const SVG = 'http://www.w3.org/2000/svg';

export interface PictureWords {
  readonly title: string;
  /** Such as "Invented data." */
  readonly stamp: string | null;
}

/** @param box holds one SVG of a known width and height, and may hold a canvas. */
export function chartSvg(box: HTMLElement, words: PictureWords): SVGSVGElement {
  const source = box.querySelector('svg');
  if (!source) throw new Error('no chart is drawn');
  const width = Number(source.getAttribute('width'));
  const height = Number(source.getAttribute('height'));
  const copy = source.cloneNode(true) as SVGSVGElement;
  writeOut(source, copy);
  const style = getComputedStyle(document.documentElement);
  const ink = style.getPropertyValue('--ink').trim();
  const lines = wrapped(words.title, width);
  const top = PAD + lines.length * LINE;
  const picture = element('svg', {
    xmlns: SVG,
    width: String(width + 2 * PAD),
    height: String(top + height + (words.stamp ? LINE : 0) + PAD),
  }) as SVGSVGElement;
  picture.append(
    element('rect', {
      width: '100%',
      height: '100%',
      fill: style.getPropertyValue('--paper').trim(),
    }),
  );
  lines.forEach((line, index) => {
    picture.append(text(line, PAD + (index + 0.7) * LINE, ink, '17', 'bold'));
  });
  copy.setAttribute('x', String(PAD));
  copy.setAttribute('y', String(top));
  copy.setAttribute('font-family', FONT);
  copy.prepend(...canvasImages(box));
  picture.append(copy);
  if (words.stamp) picture.append(text(words.stamp, top + height + LINE, ink, '14', 'normal'));
  return picture;
}

export function svgText(picture: SVGSVGElement): string {
  return new XMLSerializer().serializeToString(picture);
}

export async function svgToPng(picture: SVGSVGElement): Promise<Blob> {
  const image = new Image();
  image.src = `data:image/svg+xml;charset=utf-8,${encodeURIComponent(svgText(picture))}`;
  await image.decode();
  const canvas = document.createElement('canvas');
  canvas.width = DENSITY * Number(picture.getAttribute('width'));
  canvas.height = DENSITY * Number(picture.getAttribute('height'));
  canvas.getContext('2d')?.drawImage(image, 0, 0, canvas.width, canvas.height);
  return new Promise((resolve, reject) =>
    canvas.toBlob((blob) => (blob ? resolve(blob) : reject(new Error('no picture'))), 'image/png'),
  );
}

/** Styles in force, as attributes: outside the page there is no sheet to give them. */
function writeOut(source: Element, copy: Element): void {
  const style = getComputedStyle(source);
  for (const name of COPIED) {
    const value = style.getPropertyValue(name);
    if (value !== '') copy.setAttribute(name, value);
  }
  copy.removeAttribute('class');
  copy.removeAttribute('style');
  [...source.children].forEach((child, index) => {
    const other = copy.children[index];
    if (other) writeOut(child, other);
  });
}

function canvasImages(box: HTMLElement): SVGElement[] {
  return [...box.querySelectorAll('canvas')].map((canvas) =>
    element('image', {
      href: canvas.toDataURL('image/png'),
      x: canvas.dataset.x ?? '0',
      y: canvas.dataset.y ?? '0',
      width: String(canvas.clientWidth),
      height: String(canvas.clientHeight),
    }),
  );
}

function wrapped(title: string, width: number): string[] {
  const lines: string[] = [];
  for (const word of title.split(' ')) {
    const longer = `${lines.at(-1) ?? ''} ${word}`.trim();
    if (lines.length > 0 && textWidth(longer, 17, true) <= width) lines.splice(-1, 1, longer);
    else lines.push(word);
  }
  return lines;
}

function text(content: string, y: number, fill: string, size: string, weight: string) {
  const made = element('text', {
    x: String(PAD),
    y: String(y),
    fill,
    'font-size': size,
    'font-weight': weight,
    'font-family': FONT,
  });
  made.textContent = content;
  return made;
}

function element(name: string, attributes: Record<string, string>): SVGElement {
  const made = document.createElementNS(SVG, name);
  for (const [key, value] of Object.entries(attributes)) made.setAttribute(key, value);
  return made;
}
