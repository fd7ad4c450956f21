import { useRouter } from 'expo-router';
import { useForm } from 'react-hook-form';
import { projectPath } from '@/components/navigation/routes';
import { contractResolver } from '@/components/forms/contract-resolver';
import { Dialog, DialogDecision } from '@/components/ui/dialog';
import { Form } from '@/components/ui/form';
import { FormField } from '@/components/ui/form-field';
import { sentence } from '@/hooks/api/problem';
import { useCreateProject } from '@/hooks/queries/projects';

export interface CreateProjectDialogProps {
  open: boolean;
  onClose: () => void;
}

export function CreateProjectDialog({ open, onClose }: CreateProjectDialogProps) {
  return (
    <Dialog open={open} title="New project" onClose={onClose}>
      <CreateProjectForm onClose={onClose} />
    </Dialog>
  );
}

function CreateProjectForm({ onClose }: { onClose: () => void }) {
  const router = useRouter();
  const create = useCreateProject();
  const { control, handleSubmit } = useForm({
    resolver: contractResolver(({ CreateProject }) => CreateProject.required({ vehicle: true, description: true }).omit({ teamId: true })),
    defaultValues: { name: '', vehicle: '', description: '' },
  });
  const open = ({ id }: { id: string }) => {
    onClose();
    router.push(projectPath(id));
  };
  const submit = handleSubmit((values) => create.mutate(values, { onSuccess: open }));
  return (
    <Form onSubmit={submit} problem={create.error && sentence(create.error)}>
      <FormField
        control={control}
        name="name"
        label="Name of the loop"
        hint="As in: speed hold, wet track."
        autoFocus
        onSubmitEditing={submit}
      />
      <FormField control={control} name="vehicle" label="Car" hint="May be left empty." onSubmitEditing={submit} />
      <FormField control={control} name="description" label="What it is for" hint="May be left empty." onSubmitEditing={submit} />
      <DialogDecision label="Make the project" busyLabel="Making it" busy={create.isPending} onDecide={submit} onClose={onClose} />
    </Form>
  );
}
