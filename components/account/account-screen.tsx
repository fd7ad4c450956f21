import { StyleSheet, View } from 'react-native';
import { DeskFrame } from '@/components/navigation/desk-frame';
import { DocumentTitle } from '@/components/ui/document-title';
import { Page } from '@/components/ui/page';
import { Paper } from '@/components/ui/paper';
import { useLayout } from '@/components/ui/use-layout';
import { useMe } from '@/hooks/queries/me';
import { DeviceSection } from './device-section';
import { PreferencesSection } from './preferences-section';
import { SessionsSection } from './sessions-section';
import { YouSection } from './you-section';

export function AccountScreen() {
  const phone = useLayout() === 'phone';
  const { name } = useMe();
  const column = [styles.column, !phone && styles.share];
  return (
    <DeskFrame title="Account" sub={name} up="/">
      <DocumentTitle parts={['Account']} />
      <Page title="Account">
        <View style={phone ? styles.stack : styles.side}>
          <Paper style={column}>
            <PreferencesSection />
          </Paper>
          <Paper style={column}>
            <YouSection />
            <SessionsSection />
            <DeviceSection />
          </Paper>
        </View>
      </Page>
    </DeskFrame>
  );
}

const styles = StyleSheet.create({
  side: { flexDirection: 'row', gap: 20 },
  stack: { gap: 0 },
  column: { gap: 8 },
  share: { flex: 1 },
});
