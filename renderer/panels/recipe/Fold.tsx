import type { JSX, ReactNode } from 'react';

interface FoldProps {
  readonly title: string;
  /** What the folded part says in short. */
  readonly aside: string;
  readonly open?: boolean;
  readonly children: ReactNode;
}

/** Once it has unfolded, which may be below what is seen of its panel. */
function showWhole(fold: HTMLElement): void {
  requestAnimationFrame(() => fold.scrollIntoView({ block: 'nearest' }));
}

/** A part of the recipe that is folded away until wanted. */
export function Fold({ title, aside, open = false, children }: FoldProps): JSX.Element {
  return (
    <details
      className="fold"
      open={open}
      onToggle={({ currentTarget }) => {
        if (currentTarget.open) showWhole(currentTarget);
      }}
    >
      <summary>
        <span>{title}</span>
        <span className="fold-aside">{aside}</span>
      </summary>
      {children}
    </details>
  );
}
