import { View } from 'react-native';
import { Banner } from '@/components/ui/banner';
import { Button } from '@/components/ui/button';
import { FactTable } from '@/components/ui/fact-table';
import { Heading, Text } from '@/components/ui/text';
import type { KeptAnalysis } from '@/contract';
import { sentence } from '@/hooks/api/problem';
import { useRecompute } from '@/hooks/queries/analyses';

const short = (hash: string) => hash.slice(0, 12);

/** The proof that nothing changed: the hashes, and the same computed once more. */
export function Recompute({ projectId, analysis }: { projectId: string; analysis: KeptAnalysis }) {
  const recompute = useRecompute(projectId, analysis.id);
  const result = recompute.data;
  const differ = result?.differences ?? [];
  return (
    <View style={{ gap: 10 }}>
      <Heading level={2}>Frozen</Heading>
      <FactTable
        label="Hashes"
        facts={[
          { name: 'Engine', value: analysis.engineVersion },
          { name: 'Contents', value: short(analysis.contentHash), aside: 'SHA-256' },
          { name: 'Numbers', value: short(analysis.resultHash), aside: 'SHA-256' },
        ]}
      />
      <Button label="Compute again" busyLabel="Computing" busy={recompute.isPending} onPress={() => recompute.mutate()} />
      {recompute.error ? <Text tone="fail">{sentence(recompute.error)}</Text> : null}
      {result?.same ? (
        <Banner lead="The same." text={`Engine ${result.engineVersion} comes to the same numbers, ${short(result.resultHash)}.`} />
      ) : null}
      {result && !result.same ? (
        <>
          <Banner lead="Not the same." text={`Engine ${result.engineVersion} differs in ${differ.length} numbers. The kept ones stand.`} />
          <FactTable
            label="Differences"
            facts={differ.map((one) => ({
              name: `${one.case}, ${one.quantity}`,
              value: String(one.now ?? '–'),
              aside: `kept ${one.kept ?? '–'}`,
            }))}
          />
        </>
      ) : null}
    </View>
  );
}
