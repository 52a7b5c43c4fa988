/** Between groups of three digits: narrow, and never broken over a line. */
const GROUP = '\u202f';

/** A number with so many decimals, its whole part in groups of three; a real minus sign, and never "−0". */
export function grouped(value: number, decimals: number): string {
  const text = Math.abs(value).toFixed(decimals);
  const [whole = '0', fraction] = text.split('.');
  const groups = whole.replace(/\B(?=(\d{3})+$)/g, GROUP);
  const sign = value < 0 && Number(text) !== 0 ? '−' : '';
  return sign + groups + (fraction === undefined ? '' : `.${fraction}`);
}
