import { useQuery } from '@tanstack/react-query';
import { View } from 'react-native';
import { useMay, useProject } from '@/components/navigation/project-context';
import { QueryView } from '@/components/ui/query-view';
import { Heading } from '@/components/ui/text';
import { useMe } from '@/hooks/queries/me';
import { membersQuery } from '@/hooks/queries/members';
import { MemberRow } from './member-row';

/** Everyone with a role in the project. */
export function MemberList() {
  const { id, archived } = useProject();
  const me = useMe();
  const manages = useMay('manage') && !archived;
  const members = useQuery(membersQuery(id));
  return (
    <View style={{ gap: 12, zIndex: 2 }}>
      <Heading level={2}>Members</Heading>
      <QueryView query={members} waiting="Fetching the members">
        {(items) => {
          const owners = items.filter(({ role }) => role === 'owner').length;
          return (
            <View role="list" aria-label="Members">
              {items.map((member, index) => (
                // The list that drops out of an earlier row lies over the rows below it.
                <View key={member.userId} role="presentation" style={{ zIndex: items.length - index }}>
                  <MemberRow
                    member={member}
                    self={member.userId === me.id}
                    manages={manages}
                    lastOwner={member.role === 'owner' && owners === 1}
                  />
                </View>
              ))}
            </View>
          );
        }}
      </QueryView>
    </View>
  );
}
