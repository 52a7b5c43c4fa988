import { Tooltip } from 'radix-ui';
import type { JSX, ReactNode, Ref } from 'react';
import { useOverlays } from './useOverlays.ts';

interface IconButtonProps {
  readonly label: string;
  /** What the tip says, when more than the label. */
  readonly tip?: string;
  readonly disabled?: boolean;
  readonly pressed?: boolean;
  readonly children: ReactNode;
  readonly ref?: Ref<HTMLButtonElement>;
  onClick?(): void;
}

/** A button of one sign, with its name in a tip. It keeps its place in the order of keys while it can do nothing. */
export function IconButton({
  label,
  tip,
  disabled = false,
  pressed,
  children,
  ref,
  onClick,
}: IconButtonProps): JSX.Element {
  const overlays = useOverlays();
  return (
    <Tooltip.Root>
      <Tooltip.Trigger asChild>
        <button
          ref={ref}
          type="button"
          className="icon-button"
          aria-label={label}
          aria-disabled={disabled || undefined}
          aria-pressed={pressed}
          onClick={() => {
            if (!disabled) onClick?.();
          }}
        >
          {children}
        </button>
      </Tooltip.Trigger>
      <Tooltip.Portal container={overlays}>
        <Tooltip.Content className="tip" sideOffset={4} collisionPadding={6}>
          {tip ?? label}
        </Tooltip.Content>
      </Tooltip.Portal>
    </Tooltip.Root>
  );
}
