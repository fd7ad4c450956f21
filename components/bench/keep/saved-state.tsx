import { Text } from '@/components/ui/text';
import { useDraft } from '../bench-context';
import { savedWords } from './saved-words';

/** Whether what is on the bench is kept, and how far it was moved since. */
export function SavedState({ compact = false }: { compact?: boolean }) {
  const state = useDraft((draft) => savedWords(draft).state);
  const detail = useDraft((draft) => savedWords(draft, compact).detail);
  const stored = useDraft((draft) => draft.stored);
  return (
    <Text step={compact ? 'small' : 'note'} tone="ink2" role="status" numberOfLines={3}>
      <Text step={compact ? 'small' : 'h3'} weight={600}>
        {state}
      </Text>
      {'\n'}
      {detail}
      {stored ? '' : ', only in this window'}
    </Text>
  );
}
