import type { JSX } from 'react';

/** Symbols as they are written by hand: what follows an underscore is set low. */
export function SymbolText({ text }: { readonly text: string }): JSX.Element {
  const parts = text.split(/_((?:[\p{L}\d′]|,(?=\p{L}))+)/u);
  return (
    <>
      {parts.map((part, index) =>
        // biome-ignore lint/suspicious/noArrayIndexKey: parts of one text have no other name
        index % 2 === 1 ? <sub key={index}>{part}</sub> : <span key={index}>{part}</span>,
      )}
    </>
  );
}
