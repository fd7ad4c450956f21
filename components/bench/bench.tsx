import { useEffect, useState } from 'react';
import { View } from 'react-native';
import { useProject } from '@/components/navigation/project-context';
import { projectPath } from '@/components/navigation/routes';
import { DocumentTitle } from '@/components/ui/document-title';
import { Empty } from '@/components/ui/empty';
import { Link } from '@/components/ui/link';
import { Trouble } from '@/components/ui/trouble';
import { Waiting } from '@/components/ui/waiting';
import { BenchDesk } from './bench-desk';
import { engines } from './engine/engines';
import type { Lack } from './subject/bench-subject';
import { useBenchLink } from './subject/use-bench-link';
import { useBenchSubject } from './subject/use-bench-subject';

const lacks: Readonly<Record<Exclude<Lack, 'plant'>, string>> = {
  design: 'This design is not in the project.',
  case: 'This case is not in the project.',
};

/** The screen where gains are moved and the loop answers at once. */
export function Bench() {
  const { id: projectId } = useProject();
  const [link, changeLink] = useBenchLink();
  const [worst, setWorst] = useState<string>();
  const state = useBenchSubject(projectId, link, worst);
  // The engines start while the server is still being asked what lies on the bench.
  useEffect(() => void engines(), []);
  if (state.kind === 'waiting') return <Waiting text="Fetching plant and design" />;
  if (state.kind === 'problem') return <Trouble title="It did not load" text={state.text} onRetry={state.retry} />;
  if (state.kind === 'lacking')
    return state.lack === 'plant' ? <NoPlant projectId={projectId} /> : <Trouble title="Not here" text={lacks[state.lack]} />;
  const { subject } = state;
  return (
    <>
      <DocumentTitle parts={['Bench', subject.project.name]} />
      <BenchDesk subject={subject} link={link} onLink={changeLink} onWorst={setWorst} />
    </>
  );
}

function NoPlant({ projectId }: { projectId: string }) {
  return (
    <View style={{ padding: 20 }}>
      <Empty
        title="No plant yet"
        text="The bench needs to know what the loop drives. Enter the plant first; gains can be moved as soon as it is kept."
        action={<Link href={projectPath(projectId, 'plant')}>Enter the plant</Link>}
      />
    </View>
  );
}
