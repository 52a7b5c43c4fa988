import { useState } from 'react';
import { useRefusal } from './useRefusal.ts';

/** What came of reading a text that was typed. */
export type Reading<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly message: string };

export interface Draft {
  /** What the field shows: the text being typed, else the value. */
  readonly text: string;
  /** Why the last text was refused; null when it was not. */
  readonly message: string | null;
  readonly editing: boolean;
  type(text: string): void;
  /** Reads and hands on what was typed. `leaving` puts the old value back when it is refused. */
  commit(leaving: boolean): void;
  /** Forgets what was typed. */
  drop(): void;
  /** Shows why something else about the field was refused. */
  refuse(message: string | null): void;
}

/** A field whose text is handed on at Enter or on leaving, and refused with a reason, the old value staying. */
export function useDraft<T>(
  shown: string,
  read: (text: string) => Reading<T>,
  /** Hands the value on; a text says why it was refused. */
  onValue: (value: T) => string | null,
): Draft {
  const [typed, setTyped] = useState<string | null>(null);
  const [message, setMessage] = useRefusal(shown);

  const commit = (leaving: boolean): void => {
    if (typed === null) return;
    if (typed.trim() === shown.trim()) {
      setTyped(null);
      return;
    }
    const reading = read(typed);
    const refused = reading.ok ? onValue(reading.value) : reading.message;
    setMessage(refused === null ? null : leaving ? `${refused} The old value stays.` : refused);
    if (refused === null || leaving) setTyped(null);
  };

  return {
    text: typed ?? shown,
    message,
    editing: typed !== null,
    type: (text) => {
      setTyped(text);
      setMessage(null);
    },
    commit,
    drop: () => {
      setTyped(null);
      setMessage(null);
    },
    refuse: setMessage,
  };
}
