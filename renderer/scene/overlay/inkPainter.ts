import { type Ink, PLAQUE_HALF } from '../drawing/ink.ts';

const SVG = 'http://www.w3.org/2000/svg';

/**
 * Keeps the marks of an SVG group in step with a list of ink, touching only what has changed. The view turns at the screen's own pace,
 * far too often to go through React.
 */
export class InkPainter {
  readonly #group: SVGGElement;
  readonly #marks = new Map<
    string,
    { readonly element: SVGElement; readonly kind: Ink['kind']; written: string }
  >();

  constructor(group: SVGGElement) {
    this.#group = group;
  }

  paint(inks: readonly Ink[]): void {
    const wanted = new Set(inks.map((ink) => ink.key));
    for (const [key, mark] of this.#marks) {
      if (wanted.has(key)) continue;
      mark.element.remove();
      this.#marks.delete(key);
    }
    let after: SVGElement | null = null;
    for (const ink of inks) {
      let mark = this.#marks.get(ink.key);
      if (mark && mark.kind !== ink.kind) {
        mark.element.remove();
        mark = undefined;
      }
      if (!mark) {
        mark = { element: document.createElementNS(SVG, TAGS[ink.kind]), kind: ink.kind, written: '' };
        this.#marks.set(ink.key, mark);
      }
      // Later ink lies over earlier: keep the order of the list.
      const place: ChildNode | null = after === null ? this.#group.firstChild : after.nextSibling;
      if (mark.element !== place) this.#group.insertBefore(mark.element, place);
      after = mark.element;
      const writing = JSON.stringify(ink);
      if (mark.written === writing) continue;
      mark.written = writing;
      write(mark.element, ink);
    }
  }

  /** Takes all marks away. */
  clear(): void {
    this.paint([]);
  }
}

const TAGS: Readonly<Record<Ink['kind'], string>> = {
  path: 'path',
  words: 'text',
  ring: 'circle',
  plaque: 'g',
};

function write(element: SVGElement, ink: Ink): void {
  switch (ink.kind) {
    case 'path':
      set(element, { class: ink.look, d: ink.d });
      return;
    case 'words':
      set(element, {
        class: ink.look,
        x: ink.at[0].toFixed(1),
        y: ink.at[1].toFixed(1),
        'text-anchor': ink.anchor,
      });
      element.textContent = ink.text;
      return;
    case 'ring':
      set(element, {
        class: ink.look,
        cx: ink.at[0].toFixed(1),
        cy: ink.at[1].toFixed(1),
        r: String(ink.radius),
      });
      return;
    case 'plaque':
      writePlaque(element, ink.at, ink.text);
      return;
    default:
      ink satisfies never;
  }
}

function writePlaque(element: SVGElement, at: readonly [number, number], text: string): void {
  if (element.childElementCount === 0) {
    const square = document.createElementNS(SVG, 'rect');
    const side = String(2 * PLAQUE_HALF);
    set(square, { x: String(-PLAQUE_HALF), y: String(-PLAQUE_HALF), width: side, height: side, rx: '2' });
    const figure = document.createElementNS(SVG, 'text');
    set(figure, { y: '4', 'text-anchor': 'middle' });
    element.append(square, figure);
  }
  set(element, { class: 'scene-plaque', transform: `translate(${at[0].toFixed(1)} ${at[1].toFixed(1)})` });
  const figure = element.querySelector('text');
  if (figure) figure.textContent = text;
}

function set(element: Element, attributes: Readonly<Record<string, string>>): void {
  for (const [name, value] of Object.entries(attributes)) element.setAttribute(name, value);
}
