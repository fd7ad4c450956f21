import { StyleSheet, View } from 'react-native';
import { Banner } from '@/components/ui/banner';
import { Button } from '@/components/ui/button';
import { ago } from '@/components/ui/moment';
import type { KeptAnalysis } from '@/contract';
import type { ReadLimits } from '@/hooks/queries/limits';
import { rowsOf, sayTheSame } from './model/demand-row';
import type { useKeepLimits } from './use-keep-limits';
import type { LimitsEditing } from './use-limits-edit';

export interface LimitsNoticesProps {
  editing: LimitsEditing;
  keeping: ReturnType<typeof useKeepLimits>;
  analysis: KeptAnalysis | null;
  kept: ReadLimits;
  mayEdit: boolean;
}

/** Whether the newest analysis was judged against other limits than those that are kept now. */
export const isOutdated = (analysis: KeptAnalysis | null, { items }: ReadLimits): boolean =>
  analysis !== null && !sayTheSame(rowsOf(items, { magnitude: 'factor', frequency: 'rad/s' }), analysis.inputs.limits);

/** What is not kept, what was just done, and what someone else did. */
export function LimitsNotices({ editing, keeping, analysis, kept, mayEdit }: LimitsNoticesProps) {
  const { changed, news, edit } = editing;
  const outdated = isOutdated(analysis, kept) && !changed && keeping.busy === null;
  if (!mayEdit) return outdated ? <Banner text={`The limits changed since rev ${analysis?.design.revision} was judged.`} /> : null;
  if (changed) {
    return (
      <Banner
        lead="Not kept."
        text="A draft stays on this device."
        action={
          <View style={styles.actions}>
            {edit.past.length > 0 ? <Button kind="quiet" label="Undo" icon="undo" onPress={editing.undo} /> : null}
            <Button kind="quiet" label="Throw away" onPress={editing.discard} />
          </View>
        }
      />
    );
  }
  return (
    <>
      {news ? (
        <Banner
          lead={`${news.updatedBy} changed the limits ${news.updatedAt ? ago(news.updatedAt, new Date()) : ''}.`}
          text="They are shown here now."
        />
      ) : null}
      {keeping.said && !outdated ? <Banner text={keeping.said} /> : null}
      {outdated ? (
        <Banner
          lead={`The limits changed since rev ${analysis?.design.revision} was judged.`}
          text="Its verdicts elsewhere use the old ones; here it is laid against these."
        />
      ) : null}
      {edit.past.length > 0 && !keeping.said ? (
        <Banner text="As it was kept." action={<Button kind="quiet" label="Undo" icon="undo" onPress={editing.undo} />} />
      ) : null}
    </>
  );
}

const styles = StyleSheet.create({ actions: { flexDirection: 'row', flexWrap: 'wrap', gap: 6 } });
