/** Where a command speaks: results to `out`, everything for the person at the keyboard to `err`. */
export interface Terminal {
  readonly out: (text: string) => void;
  readonly err: (text: string) => void;
}
