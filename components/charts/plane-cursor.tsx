import { memo } from 'react';
import { clamp, contains, frequencyAtPlace, type LoopScene, nearestPlace, type PlanePicture, responseOf } from '@/figures';
import { CursorDisc } from './cursor-marks';
import { useCursor } from './cursor-provider';
import { frequencyCursorText } from './frequency-cursor';
import { Layer } from './layer';
import { PointerLayer } from './pointer-layer';
import { steppedFrequency } from './stack-cursor';

export interface PlaneCursorProps {
  scene: LoopScene;
  picture: PlanePicture;
  width: number;
  height: number;
}

/** The cursor on a plane: the frequency of the point of A that is nearest to the finger. */
export const PlaneCursor = memo(function PlaneCursor({ scene, picture, width, height }: PlaneCursorProps) {
  const [frequency, set] = useCursor('frequency');
  const { a, b } = scene;
  const { frequencies } = responseOf(a);
  const [low, high] = [frequencies[0] ?? 1, frequencies[frequencies.length - 1] ?? 1];
  const now = clamp(frequency ?? a.analysis.margins.phase?.frequency ?? Math.sqrt(low * high), low, high);
  const places = [b, a].flatMap((design) => (design === undefined ? [] : [{ design, at: picture.toPixel(design.at(now)) }]));
  return (
    <>
      <Layer width={width} height={height}>
        {places
          .filter(({ at }) => frequency !== null && contains(picture.plot, at))
          .map(({ design, at }) => (
            <CursorDisc key={design.label} at={at} design={design === a ? 'a' : 'b'} radius={4.5} />
          ))}
      </Layer>
      <PointerLayer
        rect={picture.plot}
        label="Cursor, frequency along L"
        valueText={frequencyCursorText(scene, now)}
        range={{ least: low, most: high, now }}
        onPoint={(point) => {
          const place = nearestPlace(picture.lineA, point);
          if (place !== null) set(frequencyAtPlace(frequencies, place));
        }}
        onStep={(direction, coarse) => set(steppedFrequency(now, direction, coarse, [low, high]))}
      />
    </>
  );
});
