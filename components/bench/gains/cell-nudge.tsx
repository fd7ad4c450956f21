import { memo } from 'react';
import { IconButton } from '@/components/ui/icon-button';

interface CellNudgeProps {
  label: string;
  direction: 'up' | 'down';
  disabled: boolean;
  onNudge: (fraction: number) => void;
}

/** A step of 1 % beside a gain's field. */
export const CellNudge = memo(function CellNudge({ label, direction, disabled, onNudge }: CellNudgeProps) {
  const up = direction === 'up';
  return (
    <IconButton
      icon={up ? 'plus' : 'minus'}
      outlined
      label={`${label} ${direction} 1 %`}
      disabled={disabled}
      onPress={() => onNudge(up ? 0.01 : -0.01)}
    />
  );
});
