import { View } from 'react-native';
import { useProject } from '@/components/navigation/project-context';
import { Heading, Text } from '@/components/ui/text';

/** Who may do what in the project. */
export function People() {
  const { people } = useProject();
  return (
    <View style={{ gap: 6 }}>
      <Heading level={2}>People</Heading>
      <View role="list">
        {people.map(({ id, name, role }) => (
          <View
            key={id}
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
