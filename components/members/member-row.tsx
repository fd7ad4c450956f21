import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { useProject } from '@/components/navigation/project-context';
import { useAnnounce } from '@/components/ui/announcements';
import { Button } from '@/components/ui/button';
import { ProblemLine } from '@/components/ui/problem-line';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { useLayout } from '@/components/ui/use-layout';
import type { Member, Role } from '@/contract';
import { sentence } from '@/hooks/api/problem';
import { useGiveRole } from '@/hooks/queries/members';
import { GiveUpDialog } from './give-up-dialog';
import { RoleMenu } from './role-menu';
import { roleWords } from './role-words';
import { TakeOutDialog } from './take-out-dialog';

const roles: readonly Role[] = ['owner', 'editor', 'reviewer', 'viewer'];

export interface MemberRowProps {
  member: Member;
  /** It is the reader. */
  self: boolean;
  /** Whether the reader manages members. */
  manages: boolean;
  /** Nobody else could manage the project. */
  lastOwner: boolean;
}

/** One member: who it is, what they may do, and for an owner what can be changed about it, at once. */
export function MemberRow({ member, self, manages, lastOwner }: MemberRowProps) {
  const { colors } = useTheme();
  const phone = useLayout() === 'phone';
  const { id } = useProject();
  const announce = useAnnounce();
  const give = useGiveRole(id);
  const [ending, setEnding] = useState(false);
  const [givingUp, setGivingUp] = useState<Role | null>(null);
  const change = (role: Role) =>
    give.mutate({ member, role }, { onSuccess: () => announce(`${member.name} is ${role} now.`), onSettled: () => setGivingUp(null) });
  const mayGo = (manages || self) && !lastOwner;
  const out = { key: 'out', label: self ? 'Leave the project' : 'Take out of the project', onSelect: () => setEnding(true) };
  return (
    <View role="listitem" style={[styles.row, { borderBottomColor: colors.rule }]}>
      <View style={styles.line}>
        <View style={[styles.who, !phone && styles.column]}>
          <Text step="h3">{self ? `${member.name}, you` : member.name}</Text>
          {member.email ? (
            <Text step="small" tone="ink2">
              {member.email}
            </Text>
          ) : null}
          {phone ? <What role={member.role} /> : null}
        </View>
        {phone ? null : (
          <View style={styles.column}>
            <What role={member.role} />
          </View>
        )}
        {manages ? (
          <RoleMenu
            name={`Role of ${member.name}`}
            role={member.role}
            roles={roles}
            disabled={lastOwner || give.isPending}
            more={phone && mayGo ? [out] : []}
            onChoose={(role) => (self ? setGivingUp(role) : change(role))}
          />
        ) : (
          <Text weight={600}>{member.role}</Text>
        )}
        {phone && (manages || !mayGo) ? null : (
          <View style={styles.action}>
            {mayGo ? (
              <Button
                kind="quiet"
                label={self ? 'Leave' : 'Take out'}
                aria-label={self ? 'Leave the project' : `Take ${member.name} out`}
                onPress={out.onSelect}
              />
            ) : null}
          </View>
        )}
      </View>
      {lastOwner && (manages || self) ? (
        <Text step="small" tone="ink2">
          The only owner stays. Make someone else owner first.
        </Text>
      ) : null}
      <ProblemLine text={give.error && sentence(give.error)} />
      <TakeOutDialog open={ending} member={member} self={self} onClose={() => setEnding(false)} />
      <GiveUpDialog role={givingUp} busy={give.isPending} onGiveUp={change} onClose={() => setGivingUp(null)} />
    </View>
  );
}

const What = ({ role }: { role: Role }) => (
  <Text step="note" tone="ink2">
    {roleWords(role)}
  </Text>
);

const styles = StyleSheet.create({
  row: { borderBottomWidth: 1, paddingVertical: 8, gap: 4 },
  line: { flexDirection: 'row', alignItems: 'center', gap: 10, minHeight: 46 },
  who: { flex: 1, minWidth: 0, gap: 1 },
  column: { flex: 1, minWidth: 0 },
  action: { width: 90, alignItems: 'flex-end' },
});
