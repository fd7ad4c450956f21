import { Dialog, DialogDecision } from '@/components/ui/dialog';
import { Text } from '@/components/ui/text';
import type { Role } from '@/contract';

export interface GiveUpDialogProps {
  /** What the reader would be instead of an owner; null while nothing is asked. */
  role: Role | null;
  busy: boolean;
  onGiveUp: (role: Role) => void;
  onClose: () => void;
}

/** Asked before an owner makes themselves less than that, since only another owner can undo it. */
export function GiveUpDialog({ role, busy, onGiveUp, onClose }: GiveUpDialogProps) {
  return (
    <Dialog open={role !== null} title={`Be ${role} instead of owner?`} onClose={onClose}>
      <Text tone="ink2">This page can then no longer be changed by you. Only another owner can make you owner again.</Text>
      <DialogDecision label={`Be ${role}`} busy={busy} onDecide={() => role && onGiveUp(role)} onClose={onClose} />
    </Dialog>
  );
}
