import { View } from 'react-native';
import { Page } from '@/components/ui/page';
import { Paper } from '@/components/ui/paper';
import { useLayout } from '@/components/ui/use-layout';
import type { PlantRevision } from '@/contract';
import { PlantBode } from './plant-bode';
import { PlantReading } from './plant-reading';
import { RevisionList } from './revision-list';

/** The plant's page for those who may not change it. */
export function PlantPage({ plant }: { plant: PlantRevision }) {
  const phone = useLayout() === 'phone';
  const share = phone ? { gap: 20 } : { flex: 1, gap: 20 };
  return (
    <Page title={`Plant, ${plant.name}`} sub={`rev ${plant.revision}`}>
      <View style={phone ? { gap: 8 } : { flexDirection: 'row', gap: 14 }}>
        <Paper style={share}>
          <PlantReading plant={plant} />
          <RevisionList plantId={plant.id} />
        </Paper>
        <Paper style={share}>
          <PlantBode plant={plant.plant} />
        </Paper>
      </View>
    </Page>
  );
}
