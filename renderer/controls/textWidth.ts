/** How wide a text runs in the window's type, px, measured by the page's own canvas. */

let context: CanvasRenderingContext2D | null | undefined;

type Weight = 400 | 500 | 600;

export function condensedWidth(text: string, size: number, weight: Weight = 400): number {
  return widthIn('"IBM Plex Sans Condensed"', 0.45, text, size, weight);
}

export function sansWidth(text: string, size: number, weight: Weight = 400): number {
  return widthIn('"IBM Plex Sans"', 0.55, text, size, weight);
}

/** @param usual width of a letter over its size, where nothing can be measured */
function widthIn(face: string, usual: number, text: string, size: number, weight: Weight): number {
  if (context === undefined) context = document.createElement('canvas').getContext('2d');
  if (context === null) return text.length * size * usual;
  context.font = `${weight} ${size}px ${face}, sans-serif`;
  return context.measureText(text).width;
}
