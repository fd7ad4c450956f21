import { useRouter } from 'expo-router';
import { useProject } from '@/components/navigation/project-context';
import { useAnnounce } from '@/components/ui/announcements';
import { Dialog, DialogDecision } from '@/components/ui/dialog';
import { ProblemLine } from '@/components/ui/problem-line';
import { Text } from '@/components/ui/text';
import type { Member } from '@/contract';
import { sentence } from '@/hooks/api/problem';
import { useLeave, useTakeOut } from '@/hooks/queries/members';

export interface TakeOutDialogProps {
  open: boolean;
  member: Member;
  /** The reader leaves. */
  self: boolean;
  onClose: () => void;
}

/** Asked before a membership ends: it ends at once, and only an owner's new invitation begins another. */
export function TakeOutDialog({ open, member, self, onClose }: TakeOutDialogProps) {
  const router = useRouter();
  const announce = useAnnounce();
  const { id, name } = useProject();
  const takeOut = useTakeOut(id);
  const leave = useLeave(id);
  const { mutateAsync, isPending, error } = self ? leave : takeOut;
  const ended = () => {
    announce(self ? `You left ${name}.` : `${member.name} is no longer a member.`);
    onClose();
    if (self) router.replace('/');
  };
  // The row that this stands in is gone by then, and with it callbacks of its own. What was refused is shown below.
  const end = () => mutateAsync(member).then(ended, () => undefined);
  const text = self
    ? 'From then on you do not see the project. What you kept in it stays. Only an owner can invite you again.'
    : `From then on ${member.name} does not see the project. What ${member.name} kept in it stays.`;
  return (
    <Dialog open={open} title={self ? `Leave ${name}?` : `Take ${member.name} out of ${name}?`} onClose={onClose}>
      <Text tone="ink2">{text}</Text>
      <ProblemLine text={error && sentence(error)} />
      <DialogDecision
        label={self ? 'Leave' : 'Take out'}
        busyLabel={self ? 'Leaving' : 'Taking out'}
        busy={isPending}
        onDecide={end}
        onClose={onClose}
      />
    </Dialog>
  );
}
