import { Column, Columns } from '@/components/ui/columns';
import { SheetPage } from '@/components/ui/sheet-page';
import type { PlantRevision } from '@/contract';
import { OtherNotations } from './notation/other-notations';
import { PlantBode } from './plant-bode';
import { PlantReading } from './plant-reading';
import { RevisionList } from './revision-list';

const CURVES = 420;

/** The plant's page for those who may not change it. */
export function PlantPage({ plant }: { plant: PlantRevision }) {
  return (
    <SheetPage title={`Plant, ${plant.name}`} sub={`rev ${plant.revision}. Every case builds on it.`}>
      <Columns>
        <Column>
          <PlantReading plant={plant} />
          <OtherNotations plant={plant} />
          <RevisionList plantId={plant.id} />
        </Column>
        <Column width={CURVES} last>
          <PlantBode plant={plant} />
        </Column>
      </Columns>
    </SheetPage>
  );
}
