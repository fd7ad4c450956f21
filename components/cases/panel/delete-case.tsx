import { useState } from 'react';
import { useAnnounce } from '@/components/ui/announcements';
import { Button } from '@/components/ui/button';
import { Dialog, DialogDecision } from '@/components/ui/dialog';
import { Form } from '@/components/ui/form';
import { Text } from '@/components/ui/text';
import { useProject } from '@/components/navigation/project-context';
import type { Case } from '@/contract';
import { hasStatus, sentence } from '@/hooks/api/problem';
import { useDeleteCase } from '@/hooks/queries/cases';
import { useSignal } from '@/hooks/use-signal';

/** Takes a case away, once it is confirmed. */
export function DeleteCase({ kept }: { kept: Case }) {
  const signal = useSignal();
  const [asking, ask] = useState(false);
  return (
    <>
      <Button kind="quiet" label="Delete" aria-label={`Delete ${kept.name}`} disabled={!signal} onPress={() => ask(true)} />
      <Dialog open={asking} title={`Delete ${kept.name}?`} onClose={() => ask(false)}>
        <DeleteForm kept={kept} onClose={() => ask(false)} />
      </Dialog>
    </>
  );
}

function DeleteForm({ kept, onClose }: { kept: Case; onClose: () => void }) {
  const { id: projectId } = useProject();
  const announce = useAnnounce();
  const remove = useDeleteCase(projectId);
  const meanwhile = hasStatus(remove.error, 412);
  const decide = () =>
    remove.mutate(kept, {
      onSuccess: () => {
        announce(`Deleted ${kept.name}.`);
        onClose();
      },
    });
  return (
    <Form onSubmit={decide} problem={remove.error && !meanwhile ? sentence(remove.error) : null}>
      <Text tone="ink2">The loop is no longer checked there. What was analysed keeps the case as it was.</Text>
      {meanwhile ? <Text tone="fail">Someone changed this case meanwhile: it is now “{kept.name}”. Delete it all the same?</Text> : null}
      <DialogDecision label="Delete it" busyLabel="Deleting" busy={remove.isPending} onDecide={decide} onClose={onClose} />
    </Form>
  );
}
