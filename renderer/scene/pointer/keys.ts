/** What a key asks of the view. */
export type ViewKey =
  | { readonly kind: 'turn'; readonly about: number; readonly tip: number }
  | { readonly kind: 'move'; readonly right: number; readonly down: number }
  | { readonly kind: 'closer'; readonly factor: number }
  | { readonly kind: 'fit' };

/** One press of an arrow: so many degrees, or with shift so many px; one press of + or −: by such a factor. */
const TURN = 7.5;
const MOVE = 40;
const CLOSER = 1.2;

/** Arrows turn the view, with shift they move the sheet; + and − come closer and go away; Home fits the bay. Null: another key. */
export function viewKey(key: string, shift: boolean): ViewKey | null {
  const arrow = ARROWS[key];
  if (arrow) {
    const [right, down] = arrow;
    return shift
      ? { kind: 'move', right: right * MOVE, down: down * MOVE }
      : { kind: 'turn', about: radians(right * TURN), tip: radians(down * TURN) };
  }
  switch (key) {
    case '+':
    case '=':
      return { kind: 'closer', factor: CLOSER };
    case '-':
    case '_':
      return { kind: 'closer', factor: 1 / CLOSER };
    case 'Home':
      return { kind: 'fit' };
    default:
      return null;
  }
}

const ARROWS: Readonly<Record<string, readonly [number, number]>> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, -1],
  ArrowDown: [0, 1],
};

function radians(degrees: number): number {
  return (degrees * Math.PI) / 180;
}
