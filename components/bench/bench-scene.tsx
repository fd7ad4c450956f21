import { useCallback, useState } from 'react';
import type { Compared } from './compare/use-compared';
import type { BenchActions } from './layouts/bench-actions';
import { BenchLayout } from './layouts/bench-layout';
import { useStanding } from './live/use-standing';
import { SettingsSheet } from './settings/settings-sheet';
import type { ChartSheet } from './sheets/chart-sheet';
import type { BenchLink, ChangeLink } from './subject/bench-link';

interface BenchSceneProps extends Omit<BenchActions, 'onSettings'> {
  link: BenchLink;
  onLink: ChangeLink;
  compared: Compared;
}

/** What is seen of the bench: the layout for this window, and the sheet with all settings over it. */
export function BenchScene({ link, onLink, compared, ...actions }: BenchSceneProps) {
  const standing = useStanding(compared, link.steps);
  const [settings, setSettings] = useState(false);
  const openSettings = useCallback(() => setSettings(true), []);
  const showChart = useCallback((chart: ChartSheet) => onLink({ chart }), [onLink]);
  const showCase = useCallback((id: string) => onLink({ case: id }), [onLink]);
  const follow = useCallback(() => onLink({ revision: undefined, analysis: undefined }), [onLink]);
  return (
    <>
      <BenchLayout
        {...actions}
        link={link}
        standing={standing}
        onSettings={openSettings}
        onChart={showChart}
        onCase={showCase}
        onFollow={follow}
      />
      <SettingsSheet open={settings} onClose={() => setSettings(false)} link={link} onLink={onLink} compared={compared} />
    </>
  );
}
