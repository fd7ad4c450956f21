import { useQuery } from '@tanstack/react-query';
import { useRouter } from 'expo-router';
import { StyleSheet, View } from 'react-native';
import { useProject } from '@/components/navigation/project-context';
import { type ProjectPage, projectPath } from '@/components/navigation/routes';
import { Button } from '@/components/ui/button';
import { Heading, Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { corner } from '@/components/ui/tokens';
import type { Headline } from '@/contract';
import { plantsQuery } from '@/hooks/queries/plants';

export interface Next {
  title: string;
  text: string;
  label: string;
  page: ProjectPage;
}

/** The one thing to do next, from whether there is a plant and what the newest analysis says. */
export function nextOf(hasPlant: boolean, headline: Headline | null): Next {
  const bench = { label: 'Open the bench', page: 'bench' } as const;
  if (!hasPlant)
    return { title: 'enter the plant', text: 'What the loop drives: coefficients and dead time.', label: 'Enter the plant', page: 'plant' };
  if (!headline) return { title: 'choose gains', text: 'Move them on the bench and keep what holds.', ...bench };
  if (headline.unstableCases > 0)
    return { title: 'make the loop stable', text: 'What was kept last is not stable in every case.', ...bench };
  if (headline.verdict === 'fail') return { title: 'meet the limits', text: 'What was kept last does not meet a limit.', ...bench };
  if (headline.verdict === 'notJudged')
    return { title: 'read the margins', text: `Not judged. ${headline.reason ?? 'Nothing is demanded of the loop yet.'}`, ...bench };
  return { title: 'look closer', text: 'Every limit is met. See what more gain or less of it would do.', ...bench };
}

/** The one dark box of the page. */
export function NextBox() {
  const { colors } = useTheme();
  const router = useRouter();
  const project = useProject();
  const { data: plants } = useQuery(plantsQuery(project.id));
  if (!plants) return null;
  const next = nextOf(plants.length > 0, project.headline);
  return (
    <View style={[styles.box, { backgroundColor: colors.ink }]}>
      <Heading level={2} tone="paper">{`Next: ${next.title}`}</Heading>
      <Text step="note" tone="paper">
        {next.text}
      </Text>
      <View style={styles.action}>
        <Button kind="onInk" label={next.label} onPress={() => router.push(projectPath(project.id, next.page))} />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  box: { padding: 16, borderRadius: corner, gap: 4 },
  action: { paddingTop: 8 },
});
