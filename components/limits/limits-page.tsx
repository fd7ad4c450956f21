import { StyleSheet, View } from 'react-native';
import { CasesOrLimits } from '@/components/navigation/cases-or-limits';
import { PhoneActions } from '@/components/navigation/phone-actions';
import { Button } from '@/components/ui/button';
import { Note } from '@/components/ui/note';
import { Page } from '@/components/ui/page';
import { Paper } from '@/components/ui/paper';
import { ProblemLine } from '@/components/ui/problem-line';
import { Heading, Text } from '@/components/ui/text';
import { useLayout } from '@/components/ui/use-layout';
import type { ReadLimits } from '@/hooks/queries/limits';
import { AddQuantity } from './add-quantity';
import { LimitList } from './limit-list';
import { LimitsTableContext } from './limits-context';
import { LimitsNotices } from './limits-notices';
import { StartingSetMenu } from './starting-set-menu';
import { TheirsPanel } from './theirs-panel';
import { useLimitsPage } from './use-limits-page';

/** The limits of a project: every demand with its target and source, and where the newest analysis stands to it. */
export function LimitsPage({ kept }: { kept: ReadLimits }) {
  const phone = useLayout() === 'phone';
  const page = useLimitsPage(kept);
  const { table, rows, editing, keeping } = page;
  const add = (
    <View style={styles.row}>
      <AddQuantity label={phone ? 'Add a quantity' : 'Add'} rises={phone} rows={rows} onAdd={page.add} />
    </View>
  );
  const keep = (
    <Button
      kind="primary"
      label={page.keepLabel}
      busyLabel={keeping.busy ?? undefined}
      busy={keeping.busy !== null}
      disabled={!page.mayKeep}
      onPress={page.keep}
      tall={phone}
      stretch={phone}
    />
  );
  const sets = table.mayEdit ? (
    <StartingSetMenu label={phone ? 'Sets' : 'Start from a set'} kind={phone ? 'quiet' : 'secondary'} rows={rows} onTake={page.startFrom} />
  ) : null;
  const actions = (
    <>
      <CasesOrLimits current="limits" />
      {sets}
      {table.mayEdit ? keep : null}
    </>
  );
  const foot = table.mayEdit ? (
    <>
      {add}
      <View style={styles.share}>{keep}</View>
    </>
  ) : null;
  return (
    <LimitsTableContext.Provider value={table}>
      <Page title="Limits" actions={actions} foot={foot}>
        {phone && sets ? <PhoneActions>{sets}</PhoneActions> : null}
        {page.differing ? (
          <TheirsPanel
            kept={kept}
            differing={page.differing}
            onTakeRow={page.takeRow}
            onTakeAll={page.takeTheirs}
            onPutMine={page.putMineOnTop}
          />
        ) : null}
        <LimitsNotices editing={editing} keeping={keeping} analysis={page.analysis} kept={kept} mayEdit={table.mayEdit} />
        <ProblemLine text={keeping.problem ?? keeping.judgingProblem} />
        <LimitList rows={rows} changed={editing.changed} />
        <View style={phone ? styles.stack : styles.side}>
          {table.mayEdit && !phone ? (
            <Paper style={[styles.paper, styles.over]}>
              <Heading level={2} step="h3">
                Add a quantity
              </Heading>
              <Text step="note" tone="ink2">
                What else the loop must do, from Mt and the disk margin to load dip and peak command.
              </Text>
              {add}
            </Paper>
          ) : null}
          <Paper style={[styles.paper, !phone && styles.share]}>
            <Note lead="A target is easier to live with.">
              Meeting it is a pass, meeting only the limit is tight. Left empty it stands 5°, 1 dB, 0.1 in Ms or Mt, 20 % of a delay margin
              or a tenth of a time inside the limit. Overshoot and a few others have no default: they pass or fail.
            </Note>
            <Note lead="What was analysed before keeps its own limits.">A change applies to what is analysed from now on.</Note>
          </Paper>
        </View>
      </Page>
    </LimitsTableContext.Provider>
  );
}

const styles = StyleSheet.create({
  side: { flexDirection: 'row', alignItems: 'stretch', gap: 20 },
  stack: { gap: 8 },
  paper: { gap: 10 },
  // The list that drops out of it lies over the paper beside it.
  over: { flex: 1, zIndex: 1 },
  share: { flex: 1, minWidth: 0 },
  row: { flexDirection: 'row' },
});
