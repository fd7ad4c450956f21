import { View } from 'react-native';
import { useProject } from '@/components/navigation/project-context';
import { projectPath } from '@/components/navigation/routes';
import { Text } from '@/components/ui/text';
import { SectionHead } from './section-head';

/** Who may do what in the project. */
export function People() {
  const { id, people } = useProject();
  return (
    <View style={{ gap: 6 }}>
      <SectionHead name="People" link="Members" href={projectPath(id, 'members')} />
      <View role="list">
        {people.map(({ id: person, name, role }) => (
          <View
            key={person}
            role="listitem"
            style={{ flexDirection: 'row', justifyContent: 'space-between', minHeight: 36, alignItems: 'center' }}
          >
            <Text>{name}</Text>
            <Text step="note" tone="ink2">
              {role}
            </Text>
          </View>
        ))}
      </View>
    </View>
  );
}
