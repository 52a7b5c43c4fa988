/** What every report says of itself, on its first sheet and at the foot of every page. */
export const CAUTION =
  "An aid for people competent in structural steel. It does not replace the governing code, local regulation or a licensed engineer's judgement.";
