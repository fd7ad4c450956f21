import { ScrollView, StyleSheet, View } from 'react-native';
import { CasesOrLimits } from '@/components/navigation/cases-or-limits';
import { useMayEdit } from '@/components/navigation/project-context';
import { Banner } from '@/components/ui/banner';
import { useTheme } from '@/components/ui/theme';
import { gutter } from '@/components/ui/tokens';
import { useLayout } from '@/components/ui/use-layout';
import { VerdictStrip } from '@/components/verdict/verdict-strip';
import { CaseViews } from './case-views';
import { useCasesLink } from './cases-link';
import { ChangedBanner } from './changed-banner';
import { CasesEditor } from './edit/cases-editor';
import { Legend } from './legend';
import { MakeCases } from './make-cases';
import { MiniGrids } from './grid/mini-grids';
import { NotAnalysed } from './not-analysed';
import { CasePanel } from './panel/case-panel';
import type { CaseData } from './use-case-data';
import { useOpenCase } from './use-open-case';
import { useShownCases } from './use-shown-cases';

/** The headline over all cases, the cases themselves, and the one that was opened beside them. */
export function CasesPage({ data }: { data: CaseData }) {
  const { colors } = useTheme();
  const layout = useLayout();
  const phone = layout === 'phone';
  const wide = layout === 'wide';
  const mayEdit = useMayEdit();
  const [link, change] = useCasesLink();
  const shown = useShownCases(data, link);
  const { views, analysis, conditions, misfit } = data;
  const { headline, selected } = shown;
  const { panel: panelRef, open } = useOpenCase(views, change);
  const edit = (what: string | undefined) => change({ edit: what });
  const editing = mayEdit && link.edit !== undefined;
  const editor = editing ? (
    <CasesEditor what={link.edit ?? ''} views={views} onDone={(caseId) => change({ edit: undefined, ...(caseId && { case: caseId }) })} />
  ) : null;
  if (phone && editor) return <ScrollView style={{ backgroundColor: colors.paper }}>{editor}</ScrollView>;
  const panel = editor ?? (
    <CasePanel
      view={selected}
      design={analysis?.design ?? null}
      worst={selected.kept.id === headline?.case?.id}
      capped={headline?.capped === true && selected.kept.id === headline.case?.id}
      ends={shown.ends}
      alsoHere={shown.alsoHere}
      onOpen={open}
      onEdit={edit}
      only={views.length === 1}
    />
  );
  const padding = phone ? styles.phone : styles.wide;
  return (
    <ScrollView style={{ backgroundColor: colors.paper }} contentContainerStyle={styles.page}>
      {analysis && headline ? (
        <VerdictStrip headline={headline} room={analysis.room} results={analysis.results} instead={wide ? <Legend /> : undefined} />
      ) : (
        <View style={padding}>
          <NotAnalysed caseCount={views.length} />
        </View>
      )}
      {misfit ? <Banner lead="A case does not go with its plant." text={misfit} /> : null}
      {analysis && conditions ? <ChangedBanner analysis={analysis} conditions={conditions} caseCount={views.length} /> : null}
      {phone ? <CasesOrLimits current="cases" /> : null}
      <View style={wide ? styles.side : null}>
        <View style={[wide && styles.main, { borderRightColor: colors.rule }]}>
          <CaseViews
            data={data}
            shown={shown}
            link={link}
            onChange={change}
            tools={wide && mayEdit && !editing ? <MakeCases views={views} onEdit={edit} /> : null}
          />
        </View>
        <View ref={panelRef} style={[wide ? styles.panel : null, padding, !wide && { backgroundColor: colors.paper }]}>
          {panel}
          {wide && !editor && shown.layout && analysis ? (
            <MiniGrids data={data} shown={shown} onChoose={(number) => change({ number })} />
          ) : null}
        </View>
      </View>
      <View style={[padding, styles.foot]}>
        {mayEdit && !editing && !wide ? <MakeCases views={views} onEdit={edit} /> : null}
        {wide && analysis ? null : <Legend />}
      </View>
    </ScrollView>
  );
}

const styles = StyleSheet.create({
  page: { flexGrow: 1 },
  side: { flexDirection: 'row', flexGrow: 1 },
  main: { flex: 836, minWidth: 0, borderRightWidth: 1 },
  panel: { flex: 604, minWidth: 0 },
  phone: { paddingHorizontal: gutter.phone, paddingVertical: 12, gap: 12 },
  wide: { paddingHorizontal: gutter.wide, paddingVertical: 16, gap: 16 },
  foot: { gap: 14 },
});
