import { type JSX, useId } from 'react';
import { Row } from './Row.tsx';
import { type Reading, useDraft } from './useDraft.ts';

interface TextFieldProps {
  readonly label: string;
  readonly value: string;
  readonly placeholder?: string;
  readonly bare?: boolean;
  /** Why a text will not do; null when it will. */
  check?(text: string): string | null;
  onChange(text: string): string | null;
}

export function TextField({
  label,
  value,
  placeholder,
  bare = false,
  check,
  onChange,
}: TextFieldProps): JSX.Element {
  const id = useId();
  const messageId = `${id}-message`;
  const read = (text: string): Reading<string> => {
    const message = check?.(text.trim()) ?? null;
    return message === null ? { ok: true, value: text.trim() } : { ok: false, message };
  };
  const draft = useDraft(value, read, onChange);
  const input = (
    <div className="field" data-refused={draft.message !== null || undefined}>
      <input
        id={id}
        className="field-text"
        type="text"
        aria-label={bare ? label : undefined}
        aria-invalid={draft.message !== null || undefined}
        aria-describedby={draft.message === null ? undefined : messageId}
        autoComplete="off"
        spellCheck={false}
        placeholder={placeholder}
        value={draft.text}
        onChange={(event) => draft.type(event.target.value)}
        onBlur={() => draft.commit(true)}
        onKeyDown={(event) => {
          if (event.key === 'Enter') draft.commit(false);
          if (event.key === 'Escape' && (draft.editing || draft.message !== null)) {
            event.stopPropagation();
            draft.drop();
          }
        }}
      />
    </div>
  );
  if (!bare)
    return (
      <Row label={label} htmlFor={id} message={draft.message} messageId={messageId}>
        {input}
      </Row>
    );
  return (
    <div className="bare-field">
      {input}
      {draft.message !== null && (
        <p className="row-message" id={messageId} role="alert">
          {draft.message}
        </p>
      )}
    </div>
  );
}
