import { memo } from 'react';
import { Button } from '@/components/ui/button';
import type { KeepOutcome } from './keep-outcome';
import { useKeepButton } from './use-keep-button';

interface KeepControlProps {
  outcome: KeepOutcome;
  onKeep: () => void;
  compact?: boolean;
}

/** Keeps what is on the bench as the next revision; nothing for those who may not. */
export const KeepControl = memo(function KeepControl({ outcome, onKeep, compact = false }: KeepControlProps) {
  const { offered, revision, disabled } = useKeepButton();
  if (!offered) return null;
  const label = compact ? `Keep rev ${revision}` : `Keep as rev ${revision}`;
  return (
    <Button
      kind="primary"
      label={label}
      busy={outcome.kind === 'keeping'}
      busyLabel="Keeping"
      disabled={disabled}
      stretch={!compact}
      onPress={onKeep}
    />
  );
});
