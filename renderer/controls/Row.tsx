import type { JSX, ReactNode } from 'react';

interface RowProps {
  readonly label: string;
  /** Id of the control that the label names; none for a group that names itself. */
  readonly htmlFor?: string;
  readonly message?: string | null;
  readonly messageId?: string;
  readonly children: ReactNode;
}

/** A label and its control side by side, with room below for why something was refused. */
export function Row({ label, htmlFor, message = null, messageId, children }: RowProps): JSX.Element {
  return (
    <div className="row">
      {htmlFor === undefined ? (
        <span className="row-label" aria-hidden="true">
          {label}
        </span>
      ) : (
        <label className="row-label" htmlFor={htmlFor}>
          {label}
        </label>
      )}
      <div className="row-control">{children}</div>
      {message !== null && (
        <p className="row-message" id={messageId} role="alert">
          {message}
        </p>
      )}
    </div>
  );
}
