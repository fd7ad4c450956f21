import { memo, useEffect } from 'react';
import { View } from 'react-native';
import { useAnnounce } from '@/components/ui/announcements';
import { Banner } from '@/components/ui/banner';
import { useUnits } from '@/components/ui/units';
import { useBench, useDraft, useWarnings } from '../bench-context';
import { isMoved } from '../draft/draft';
import { isOvertaken } from '../draft/meet-latest';
import { type KeepOutcome, keepWords, type KeepWords } from './keep-outcome';
import { OvertakenBanner } from './overtaken-banner';

interface NoticesProps {
  outcome: KeepOutcome;
  onFollow: () => void;
}

/** What has to be said beside the numbers: what became of keeping, a newer revision, and what the engine warns of. */
export const Notices = memo(function Notices({ outcome, onFollow }: NoticesProps) {
  const announce = useAnnounce();
  const words = useOutcomeWords(outcome);
  const warnings = useWarnings();
  const spoken = words && `${words.lead} ${words.text}`;
  useEffect(() => {
    if (spoken) announce(spoken);
  }, [spoken, announce]);
  return (
    <View>
      {words && <Banner {...words} />}
      <OvertakenBanner onFollow={onFollow} />
      {warnings.map(({ code, message }) => (
        <Banner key={code} text={message} />
      ))}
    </View>
  );
});

/** "Kept as" holds until the next move; a refusal for being late is told by the newer revision itself once that is known. */
function useOutcomeWords(outcome: KeepOutcome): KeepWords | null {
  const units = useUnits();
  const latest = useBench().subject.latest?.revision ?? null;
  const moved = useDraft(isMoved);
  const overtaken = useDraft((draft) => isOvertaken(draft, latest));
  if (outcome.kind === 'kept' && moved) return null;
  if (outcome.kind === 'overtaken' && overtaken) return null;
  return keepWords(outcome, units);
}
