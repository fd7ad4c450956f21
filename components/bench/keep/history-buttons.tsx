import { memo } from 'react';
import { IconButton } from '@/components/ui/icon-button';
import { useHistory } from '../draft/use-history';

/** Undo and redo, each named after what it would change. */
export const HistoryButtons = memo(function HistoryButtons() {
  const { undo, redo } = useHistory();
  return (
    <>
      <IconButton icon="undo" outlined label={undo.label} disabled={!undo.possible} onPress={undo.take} />
      <IconButton icon="redo" outlined label={redo.label} disabled={!redo.possible} onPress={redo.take} />
    </>
  );
});
