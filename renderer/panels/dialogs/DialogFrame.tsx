import { type JSX, type ReactNode, useEffect, useId, useRef } from 'react';
import { CloseSign } from '../../glyphs/signs.tsx';
import './dialogs.css';

interface DialogFrameProps {
  readonly title: string;
  readonly wide?: boolean;
  /** For a question that must be answered: no way out but its buttons and Escape. */
  readonly question?: boolean;
  readonly children: ReactNode;
  /** The row of buttons at the foot. */
  readonly buttons?: ReactNode;
  /** Escape, the cross, or a click beside the dialog. */
  onClose(): void;
}

/** A dialog over the window; the page behind it keeps still, and the focus goes back where it was. */
export function DialogFrame({
  title,
  wide = false,
  question = false,
  children,
  buttons,
  onClose,
}: DialogFrameProps): JSX.Element {
  const dialog = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    const element = dialog.current;
    if (element === null) return;
    element.showModal();
    // The answer that stands ready, where a dialog names one.
    element.querySelector<HTMLElement>('[data-first]')?.focus();
    return () => element.close();
  }, []);
  return (
    // biome-ignore lint/a11y/useKeyWithClickEvents: Escape does what a click beside the dialog does.
    <dialog
      ref={dialog}
      className="dialog"
      data-wide={wide || undefined}
      aria-labelledby={titleId}
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
      onClick={(event) => {
        if (!question && event.target === dialog.current) onClose();
      }}
    >
      <div className="dialog-inside">
        <div className="dialog-head">
          <h2 id={titleId}>{title}</h2>
          {!question && (
            <button type="button" className="icon-button" aria-label="Close" onClick={onClose}>
              <CloseSign />
            </button>
          )}
        </div>
        <div className="dialog-body">{children}</div>
        {buttons !== undefined && <div className="dialog-buttons">{buttons}</div>}
      </div>
    </dialog>
  );
}
