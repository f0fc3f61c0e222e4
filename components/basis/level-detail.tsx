import type { Level } from '@/api/contracts/basis';
import { DeleteButton } from '@/components/job/delete-button';
import { useRowRoutes } from '@/components/job/use-row-routes';
import { useUses } from '@/components/job/use-uses';
import { FactList } from '@/components/ui/fact-list';
import { Loading } from '@/components/ui/loading';
import { useBasis, useLevelActions } from '@/hooks/use-basis';
import { useMay } from '@/hooks/use-session';

import { LevelForm, levelFacts } from './level-form';

/** A level to change, for who may; to read, for everyone else. */
export function LevelDetail({ jobId, level }: { jobId: string; level: Level | null }) {
  const mayEdit = useMay('edit-jobs');
  const { levels } = useBasis(jobId);
  const routes = useRowRoutes({ list: `/jobs/${jobId}/levels`, one: (id) => `/jobs/${jobId}/levels/${id}` });
  if (!levels) return <Loading label="Level" shape="form" />;
  if (level && !mayEdit) return <FactList facts={levelFacts(level)} />;
  return (
    <LevelForm
      jobId={jobId}
      row={level}
      next={Math.min(999, Math.max(0, ...levels.map(({ position }) => position)) + 1)}
      onSaved={({ id, name }) =>
        level ? routes.changed(`${name} is saved.`) : routes.created(id, `${name} is added.`)
      }
      onCancel={level ? undefined : routes.cancel}
      actions={level ? <LevelActions jobId={jobId} level={level} onDeleted={routes.gone} /> : undefined}
    />
  );
}

type LevelActionsProps = { jobId: string; level: Level; onDeleted: () => void };

function LevelActions({ jobId, level, onDeleted }: LevelActionsProps) {
  const { remove } = useLevelActions(jobId);
  const uses = useUses(jobId, { by: 'levelId', id: level.id });
  return (
    <DeleteButton noun="level" name={level.name} uses={uses} onDelete={() => remove(level)} onDeleted={onDeleted} />
  );
}
