import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { useMayEdit, useProject } from '@/components/navigation/project-context';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Heading, Text } from '@/components/ui/text';
import { AboutForm } from './about-form';

/** What the project is for, and the way to say it otherwise. */
export function About() {
  const project = useProject();
  const mayEdit = useMayEdit();
  const [changing, setChanging] = useState(false);
  const close = () => setChanging(false);
  return (
    <View style={styles.section}>
      <View style={styles.head}>
        <Heading level={2}>About</Heading>
        {mayEdit ? <Button kind="quiet" label="Change" aria-label="Change name and purpose" onPress={() => setChanging(true)} /> : null}
      </View>
      <Text step="prose" tone={project.description ? 'ink' : 'ink2'}>
        {project.description || 'Nobody said what it is for.'}
      </Text>
      <Dialog open={changing} title="Name and purpose" onClose={close}>
        <AboutForm project={project} onClose={close} />
      </Dialog>
    </View>
  );
}

const styles = StyleSheet.create({
  section: { gap: 4 },
  head: { flexDirection: 'row', alignItems: 'center', justifyContent: 'space-between', minHeight: 44 },
});
