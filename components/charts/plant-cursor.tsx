import { type FrequencyAxis, formatFrequency, type PanelPicture, type PlantScene, toDecibels, withUnit } from '@/figures';
import { useCursor } from './cursor-provider';
import { plantCells, plantCursorText } from './plant-words';
import { ReadOutLine } from './read-out-line';
import { StackCursor } from './stack-cursor';

export interface PlantCursorProps {
  scene: PlantScene;
  magnitude: PanelPicture;
  phase: PanelPicture;
  across: FrequencyAxis;
  size: { width: number; height: number; foot: number };
}

/** The cursor of a plant sheet, with a disc on either curve. */
export function PlantCursor({ scene, magnitude, phase, across, size }: PlantCursorProps) {
  const discsAt = (now: number) => {
    const x = across.at(now);
    const point = scene.at(now);
    return [
      { plot: magnitude.plot, a: [{ x, y: magnitude.axis.at(toDecibels(point.magnitude)) }], b: [] },
      { plot: phase.plot, a: [{ x, y: phase.axis.at(point.phaseDegrees) }], b: [] },
    ];
  };
  return (
    <StackCursor
      plots={[magnitude.plot, phase.plot]}
      across={across}
      size={size}
      unit={scene.units.frequency}
      rest={undefined}
      valueText={(now) => plantCursorText(scene, now)}
      discsAt={discsAt}
    />
  );
}

/** What the plant is at the frequency of the cursor; at 1 of the reader's unit while no cursor stands. */
export function PlantReadOut({ scene, rest }: { scene: PlantScene; rest: number }) {
  const [cursor] = useCursor('frequency');
  const { frequency: unit, magnitude: gainUnit } = scene.units;
  const frequency = cursor ?? rest;
  const [gain, phase] = plantCells(scene, frequency);
  const cells = [
    { name: '|P|', value: gain, unit: gainUnit === 'dB' ? 'dB' : '' },
    { name: 'arg P', value: phase, unit: '°' },
  ];
  return <ReadOutLine place={withUnit(formatFrequency(frequency, unit), unit)} cells={cells} />;
}
