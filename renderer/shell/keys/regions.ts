/** The parts of the window that F6 goes round; each carries `data-region` and can take the focus. */

export function toNextRegion(step: 1 | -1): void {
  const regions = [...document.querySelectorAll<HTMLElement>('[data-region]')];
  const at = regions.findIndex((region) => region.contains(document.activeElement));
  const next = regions[(at + step + regions.length) % regions.length];
  next?.focus();
}

/** The drawing takes the keys, or the part that it stands in where there is none. */
export function toDrawing(): void {
  const drawing = document.querySelector<HTMLElement>('.scene-stage');
  (drawing ?? document.querySelector<HTMLElement>('.view-panel'))?.focus();
}
