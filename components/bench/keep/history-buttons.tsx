import { memo, useDeferredValue } from 'react';
import { IconButton, type IconButtonProps } from '@/components/ui/icon-button';
import { type HistoryStep, useHistory } from '../draft/use-history';

/** Undo and redo, each named after what it would change. */
export const HistoryButtons = memo(function HistoryButtons() {
  const { undo, redo } = useHistory();
  return (
    <>
      <StepButton icon="undo" {...undo} />
      <StepButton icon="redo" {...redo} />
    </>
  );
});

/** Its name may follow a moving gain when there is time. */
function StepButton({ icon, possible, label, take }: HistoryStep & Pick<IconButtonProps, 'icon'>) {
  const name = useDeferredValue(label);
  return <SteadyButton icon={icon} outlined label={name} disabled={!possible} onPress={take} />;
}

const SteadyButton = memo(IconButton);
