import { useRouter } from 'expo-router';
import { type ReactNode, useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { useProject } from '@/components/navigation/project-context';
import { benchPath } from '@/components/navigation/routes';
import { Banner } from '@/components/ui/banner';
import { Button } from '@/components/ui/button';
import { DocumentTitle } from '@/components/ui/document-title';
import { Menu } from '@/components/ui/menu';
import { moment } from '@/components/ui/moment';
import { Page } from '@/components/ui/page';
import { Paper } from '@/components/ui/paper';
import { QueryView } from '@/components/ui/query-view';
import { Heading, Text } from '@/components/ui/text';
import { useLayout } from '@/components/ui/use-layout';
import { CheckTable } from '@/components/verdict/check-table';
import { VerdictStrip } from '@/components/verdict/verdict-strip';
import type { KeptAnalysis } from '@/contract';
import { chartLimits } from '@/figures';
import { CaseCurves } from './case-curves';
import { LoopNumbers, ResponseNumbers } from './case-numbers';
import { FrozenInputs } from './frozen-inputs';
import { Recompute } from './recompute';
import { useCaseCurves } from './use-case-curves';

const plantOf = ({ inputs: { cases } }: KeptAnalysis, caseId: string | undefined) =>
  (cases.find(({ id }) => id === caseId) ?? cases[0]).plant;

/** One kept analysis by its address: its number, curves, numbers, what it was computed from, and the proof that it is still the same. */
export function AnalysisScreen({ analysisId }: { analysisId: string }) {
  const project = useProject();
  const [chosen, choose] = useState<string>();
  const { kept, curves, design, caseId } = useCaseCurves({ projectId: project.id, analysisId, caseId: chosen });
  return (
    <QueryView query={kept} waiting="Fetching the analysis" missing="No such analysis in this project.">
      {(analysis) => (
        <AnalysisPage analysis={analysis} caseId={caseId} onCase={choose}>
          <QueryView query={{ ...curves, data: design }} waiting="Computing the curves">
            {(a) => (
              <CaseCurves
                design={a}
                limits={chartLimits(analysis.inputs.limits, analysis.inputs.design.actuator)}
                plantUnits={plantOf(analysis, caseId).units}
              />
            )}
          </QueryView>
        </AnalysisPage>
      )}
    </QueryView>
  );
}

interface AnalysisPageProps {
  analysis: KeptAnalysis;
  caseId: string | undefined;
  onCase: (caseId: string) => void;
  children: ReactNode;
}

function AnalysisPage({ analysis, caseId, onCase, children }: AnalysisPageProps) {
  const project = useProject();
  const router = useRouter();
  const phone = useLayout() === 'phone';
  const result = analysis.results.find((one) => one.case.id === caseId) ?? analysis.results[0];
  const { units } = plantOf(analysis, result.case.id);
  const { id, name, revision } = analysis.design;
  const title = `${name}, rev ${revision}`;
  const bench = <Button kind="primary" label="Open on bench" onPress={() => router.push(benchPath(project.id, id, revision))} />;
  const cases = analysis.results.map((one) => ({
    key: one.case.id,
    label: one.case.name,
    current: one === result,
    onSelect: () => onCase(one.case.id),
  }));
  const computed = `computed ${moment(analysis.createdAt, new Date(), true)} by ${analysis.createdBy}, engine ${analysis.engineVersion}`;
  const demandsHeading = `What is demanded of ${result.case.name}`;
  const column = phone ? styles.stackColumn : styles.column;
  return (
    <Page title={title} sub={computed} actions={bench}>
      <DocumentTitle parts={[title, 'Analyses', project.name]} />
      <VerdictStrip headline={analysis.headline} room={analysis.room} results={analysis.results} />
      {phone ? (
        <Paper>
          <Heading level={2}>{title}</Heading>
          <Text step="note" tone="ink2">
            {computed}
          </Text>
          {bench}
        </Paper>
      ) : null}
      {cases.length > 1 ? <Menu label={`Curves show ${result.case.name}`} kind="quiet" items={cases} /> : null}
      {result.numbers.warnings.map(({ code, message }) => (
        <Banner key={code} text={message} />
      ))}
      {children}
      <View style={phone ? styles.stack : styles.side}>
        {result.checks.length > 0 ? (
          <Paper style={column}>
            <Heading level={2}>{demandsHeading}</Heading>
            <CheckTable label={demandsHeading} checks={result.checks} unstable={!result.numbers.closedLoop.stable} />
          </Paper>
        ) : null}
        <Paper style={column}>
          <LoopNumbers name={result.case.name} numbers={result.numbers} />
        </Paper>
        <Paper style={column}>
          <ResponseNumbers numbers={result.numbers} plantUnits={units} />
          <Recompute projectId={project.id} analysis={analysis} />
        </Paper>
        <Paper style={column}>
          <FrozenInputs analysis={analysis} />
        </Paper>
      </View>
    </Page>
  );
}

const styles = StyleSheet.create({
  side: { flexDirection: 'row', flexWrap: 'wrap', gap: 14 },
  stack: { gap: 8 },
  column: { flexGrow: 1, flexBasis: 360, gap: 26 },
  stackColumn: { gap: 20 },
});
