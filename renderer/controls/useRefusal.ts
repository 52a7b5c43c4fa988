import { useState } from 'react';
import { useWindow } from '../shell/services.tsx';
import { presentProject } from '../store/shown.ts';

/** Why what was typed last was refused. It goes by itself once the field's value or anything else of the project has changed. */
export function useRefusal(value: unknown): readonly [string | null, (message: string | null) => void] {
  const project = useWindow(presentProject);
  const [refused, setRefused] = useState<{
    readonly message: string | null;
    readonly value: unknown;
    readonly project: unknown;
  } | null>(null);
  const stands = refused !== null && refused.value === value && refused.project === project;
  return [stands ? refused.message : null, (message) => setRefused({ message, value, project })];
}
