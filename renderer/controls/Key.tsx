import type { JSX } from 'react';

/** A key beside the words of a button. The key itself is told to assistive technology by `aria-keyshortcuts` or in the Keyboard dialog. */
export function Key({ children }: { readonly children: string }): JSX.Element {
  return (
    <span className="key" aria-hidden="true">
      {children}
    </span>
  );
}
