import { useForm } from 'react-hook-form';
import { contractResolver } from '@/components/forms/contract-resolver';
import { DialogDecision } from '@/components/ui/dialog';
import { Form } from '@/components/ui/form';
import { FormField } from '@/components/ui/form-field';
import { sentence } from '@/hooks/api/problem';
import { type ReadProject, useUpdateProject } from '@/hooks/queries/projects';

/** Name, car and purpose of a project. Where someone else changed them meanwhile it says so, and what was typed stays. */
export function AboutForm({ project, onClose }: { project: ReadProject; onClose: () => void }) {
  const update = useUpdateProject(project);
  const { control, handleSubmit } = useForm({
    resolver: contractResolver(({ UpdateProject }) =>
      UpdateProject.omit({ archived: true }).required({ name: true, vehicle: true, description: true }),
    ),
    defaultValues: { name: project.name, vehicle: project.vehicle, description: project.description },
  });
  const submit = handleSubmit((values) => update.mutate(values, { onSuccess: onClose }));
  return (
    <Form onSubmit={submit} problem={update.error && sentence(update.error)}>
      <FormField control={control} name="name" label="Name of the loop" autoFocus onSubmitEditing={submit} />
      <FormField control={control} name="vehicle" label="Car" hint="May be left empty." onSubmitEditing={submit} />
      <FormField control={control} name="description" label="What it is for" hint="May be left empty." onSubmitEditing={submit} />
      <DialogDecision label="Change" busyLabel="Changing it" busy={update.isPending} onDecide={submit} onClose={onClose} />
    </Form>
  );
}
