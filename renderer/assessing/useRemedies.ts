import { useEffect, useState } from 'react';
import type { Project } from '../../core/project/model.ts';
import type { Remedy } from '../../core/remedies/model.ts';
import { useServices, useWindow } from '../shell/services.tsx';

export interface RemediesOf {
  readonly finding: string;
  /** Null while they are worked out. */
  readonly remedies: readonly Remedy[] | null;
}

const NONE: readonly RemediesOf[] = [];

/** The remedies of findings of the project as it stands, in the order of the findings. A change on trial leaves them as they are. */
export function useRemedies(findings: readonly string[]): readonly RemediesOf[] {
  const { assessor } = useServices();
  const project = useWindow((state) => state.assessing.base?.project ?? null);
  const key = findings.join('\n');
  const [answers, setAnswers] = useState<{
    project: Project | null;
    key: string;
    list: readonly RemediesOf[];
  }>({
    project: null,
    key: '',
    list: NONE,
  });
  useEffect(() => {
    if (project === null) return;
    let wanted = true;
    const ids = key === '' ? [] : key.split('\n');
    const list: RemediesOf[] = ids.map((finding) => ({ finding, remedies: null }));
    const show = (): void => {
      if (wanted) setAnswers({ project, key, list: [...list] });
    };
    ids.forEach((finding, index) => {
      const put = (remedies: readonly Remedy[]): void => {
        list[index] = { finding, remedies };
        show();
      };
      assessor.remedies(project, finding).then(put, () => put([]));
    });
    show();
    return () => {
      wanted = false;
    };
  }, [assessor, project, key]);
  // While the next answers are on their way, the last ones of these findings stay, so that the list does not flicker.
  return answers.key === key ? answers.list : NONE;
}
