/** The docks' sizes to begin with, px, by the window's. */
export function firstSizes(
  width: number,
  height: number,
): { readonly left: number; readonly card: number; readonly dock: number } {
  const narrow = width < 1400;
  return {
    left: narrow ? 226 : 252,
    card: narrow ? 380 : 424,
    dock: Math.round(Math.min(300, Math.max(176, height * 0.255))),
  };
}
