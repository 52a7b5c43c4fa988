/** How wide a text runs in the condensed type, px, measured by the page's own canvas. */

let context: CanvasRenderingContext2D | null | undefined;

export function condensedWidth(text: string, size: number, weight: 400 | 500 | 600 = 400): number {
  if (context === undefined) context = document.createElement('canvas').getContext('2d');
  if (context === null) return text.length * size * 0.45;
  context.font = `${weight} ${size}px "IBM Plex Sans Condensed", sans-serif`;
  return context.measureText(text).width;
}
