import { StyleSheet, View } from 'react-native';
import { Banner } from '@/components/ui/banner';
import { Button } from '@/components/ui/button';
import { useMe } from '@/hooks/queries/me';
import { useBench, useDraft } from '../bench-context';
import { isMoved } from '../draft/draft';
import { isOvertaken } from '../draft/meet-latest';
import { settingsOf } from '../draft/settings';
import { whyNotKept } from './saved-words';

/** Someone kept a newer revision than the one on the bench: what it is, and the two ways on. Nothing is lost by either. */
export function OvertakenBanner({ onFollow }: { onFollow: () => void }) {
  const { subject, store } = useBench();
  const me = useMe();
  const { latest, pinned, project } = subject;
  const overtaken = useDraft((draft) => isOvertaken(draft, latest?.revision ?? null));
  const moved = useDraft(isMoved);
  const from = useDraft(({ base }) => base.revision);
  if (!overtaken || !latest) return null;
  const newest = { revision: latest.revision, settings: settingsOf(latest) };
  const take = () => {
    store.getState().take(newest);
    onFollow();
  };
  const who = latest.authorId === me.id ? 'You' : latest.createdBy;
  const words =
    pinned && !moved
      ? { lead: `You see rev ${from}.`, text: `The newest is rev ${latest.revision}, kept by ${latest.createdBy}.` }
      : {
          lead: `${who} kept rev ${latest.revision} meanwhile.`,
          text: `Your draft was moved from rev ${from ?? 0} and is still here.`,
        };
  return (
    <Banner
      {...words}
      action={
        <View style={styles.actions}>
          {moved && whyNotKept(project) === null && (
            <Button label={`Put mine on top of rev ${latest.revision}`} onPress={() => store.getState().rebase(newest)} />
          )}
          <Button kind="quiet" label={`Show rev ${latest.revision}`} onPress={take} />
        </View>
      }
    />
  );
}

const styles = StyleSheet.create({ actions: { flexDirection: 'row', flexWrap: 'wrap', gap: 6 } });
