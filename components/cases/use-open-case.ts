import { useCallback, useRef } from 'react';
import type { View } from 'react-native';
import { useAnnounce } from '@/components/ui/announcements';
import { verdictWords } from '@/figures/verdict-shape';
import { caseVerdict } from './model/case-verdict';
import type { CaseView } from './model/case-view';

/** Opens a case in the panel: says so to those who listen, and brings the panel into view where it stands further down. */
export function useOpenCase(views: readonly CaseView[], change: (link: { case: string }) => void) {
  const panel = useRef<View>(null);
  const announce = useAnnounce();
  const open = useCallback(
    (caseId: string) => {
      const view = views.find(({ kept }) => kept.id === caseId);
      if (view) announce(`Opened ${view.kept.name}, ${verdictWords[caseVerdict(view)]}.`);
      change({ case: caseId });
      const element = panel.current as unknown as HTMLElement | null;
      if (element && element.getBoundingClientRect().top > window.innerHeight - LEAST_SEEN) element.scrollIntoView({ block: 'start' });
    },
    [views, change, announce],
  );
  return { panel, open };
}

/** Pixels of the panel that tell that it is there. */
const LEAST_SEEN = 160;
