import { useEffect, useState } from 'react';
import { useUnits } from '@/components/ui/units';
import { useMe } from '@/hooks/queries/me';
import type { ReadLimits } from '@/hooks/queries/limits';
import type { DemandRow } from './model/demand-row';
import { forgetLimitsDraft, keepLimitsDraft, recallLimitsDraft } from './model/limits-draft';
import { baseOf, beginEdit, changeRows, editIn, isChanged, type LimitsEdit, meetKept, undo } from './model/limits-edit';

/**
 * The limits of a project as they are edited on this device. While nothing is typed they follow what others keep; once something
 * is, they stay as typed, over a reload too, and `overtaken` says that someone kept others meanwhile.
 */
export function useLimitsEdit(projectId: string, kept: ReadLimits) {
  const units = useUnits();
  const me = useMe();
  const [edit, setEdit] = useState(() => recallLimitsDraft(projectId) ?? beginEdit(baseOf(kept), units));
  const [news, setNews] = useState<ReadLimits | null>(null);
  const met = editIn(meetKept(edit, baseOf(kept)), units);
  if (met !== edit) {
    if (met.base.etag !== edit.base.etag && kept.updatedBy !== me.name) setNews(kept);
    setEdit(met);
  }
  const changed = isChanged(met);
  useEffect(() => {
    if (changed) keepLimitsDraft(projectId, met);
    else forgetLimitsDraft(projectId);
  }, [changed, projectId, met]);
  return {
    edit: met,
    changed,
    overtaken: met.base.etag !== kept.etag,
    /** What someone else kept while nothing was typed here, and what is shown now. */
    news,
    change: (rows: readonly DemandRow[], typing?: string) => setEdit((now) => changeRows(now, rows, typing)),
    undo: () => setEdit(undo),
    /** These rows on the version that is kept now. */
    rebase: (rows: readonly DemandRow[]) => setEdit((now) => ({ ...changeRows(now, rows), base: baseOf(kept) })),
    discard: () => setEdit((now) => ({ ...beginEdit(baseOf(kept), units), past: [...now.past, now.rows] })),
  };
}
export type LimitsEditing = ReturnType<typeof useLimitsEdit>;
export type { LimitsEdit };
