import { useRouter } from 'expo-router';
import { useState } from 'react';
import { View } from 'react-native';
import { useProject } from '@/components/navigation/project-context';
import { Button } from '@/components/ui/button';
import { Dialog, DialogDecision } from '@/components/ui/dialog';
import { Field } from '@/components/ui/field';
import { Form } from '@/components/ui/form';
import { Heading, Text } from '@/components/ui/text';
import { sentence } from '@/hooks/api/problem';
import { type ReadProject, useDeleteProject, useUpdateProject } from '@/hooks/queries/projects';

/** What only the owner may do: put the project away, or end it. */
export function OwnerSection() {
  const project = useProject();
  const update = useUpdateProject(project);
  const [deleting, setDeleting] = useState(false);
  return (
    <View style={{ gap: 8 }}>
      <Heading level={2}>Yours to end</Heading>
      <View style={{ flexDirection: 'row', gap: 10, flexWrap: 'wrap' }}>
        <Button
          label={project.archived ? 'Take out of the archive' : 'Archive'}
          busy={update.isPending}
          onPress={() => update.mutate({ archived: !project.archived })}
        />
        <Button label="Delete" onPress={() => setDeleting(true)} />
      </View>
      {update.error ? <Text tone="fail">{sentence(update.error)}</Text> : null}
      <Dialog open={deleting} title={`Delete ${project.name}?`} onClose={() => setDeleting(false)}>
        <DeleteForm project={project} onClose={() => setDeleting(false)} />
      </Dialog>
    </View>
  );
}

function DeleteForm({ project, onClose }: { project: ReadProject; onClose: () => void }) {
  const router = useRouter();
  const remove = useDeleteProject(project);
  const [name, setName] = useState('');
  const [wrong, setWrong] = useState(false);
  const type = (text: string) => {
    setName(text);
    setWrong(false);
  };
  const submit = () => {
    if (name.trim() === project.name) remove.mutate(project.name, { onSuccess: () => router.replace('/') });
    else setWrong(true);
  };
  return (
    <Form onSubmit={submit} problem={remove.error && sentence(remove.error)}>
      <Text tone="ink2">Its plants, designs and analyses go with it, for everyone. This cannot be taken back.</Text>
      <Text>
        Its name is <Text weight={600}>{project.name}</Text>
      </Text>
      <Field
        label="Repeat the name"
        error={wrong ? 'That is not its name. Nothing was deleted.' : undefined}
        value={name}
        onChangeText={type}
        autoFocus
        onSubmitEditing={submit}
      />
      <DialogDecision label="Delete it" busyLabel="Deleting" busy={remove.isPending} onDecide={submit} onClose={onClose} />
    </Form>
  );
}
