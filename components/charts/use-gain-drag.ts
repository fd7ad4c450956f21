import { useRef, useState } from 'react';
import type { PointerEvent } from 'react-native';
import { draggedGain, type GainScaleInput } from '@/figures';

export type GainChange = (value: number, phase: 'move' | 'end') => void;

interface Drag {
  /** The scale as it stood where the drag, or its finer part, began. */
  readonly scale: GainScaleInput;
  readonly from: number;
  readonly fine: boolean;
}

/** Pixels before a press counts as a drag, so that a tap changes nothing. */
const SLOP = 3;

const capture = ({ currentTarget, nativeEvent }: PointerEvent): void => {
  const element = currentTarget as unknown as Partial<Element>;
  element.setPointerCapture?.(nativeEvent.pointerId);
};

/**
 * Dragging the scale under its needle, with a second finger ten times finer. Every move is told at once, the end once more.
 * `dragged` is the scale that the drag began with, null at rest: a drag through zero keeps its kind of scale.
 */
export function useGainDrag(scale: GainScaleInput, onChange: GainChange) {
  const fingers = useRef(new Set<number>());
  const drag = useRef<Drag | null>(null);
  const value = useRef(scale.value);
  const [dragged, setDragged] = useState<GainScaleInput | null>(null);

  const onPointerDown = (event: PointerEvent) => {
    fingers.current.add(event.nativeEvent.pointerId);
    capture(event);
    if (drag.current !== null) return;
    value.current = scale.value;
    drag.current = { scale, from: event.nativeEvent.clientX, fine: false };
  };

  const onPointerMove = ({ nativeEvent }: PointerEvent) => {
    const now = drag.current;
    if (now === null || nativeEvent.pointerId !== Math.min(...fingers.current)) return;
    const fine = fingers.current.size > 1;
    if (fine !== now.fine) {
      drag.current = { scale: { ...now.scale, value: value.current }, from: nativeEvent.clientX, fine };
      return;
    }
    const dx = nativeEvent.clientX - now.from;
    if (dragged === null && Math.abs(dx) < SLOP) return;
    if (dragged === null) setDragged(now.scale);
    value.current = draggedGain(now.scale, dx, fine);
    onChange(value.current, 'move');
  };

  const onPointerUp = ({ nativeEvent }: PointerEvent) => {
    fingers.current.delete(nativeEvent.pointerId);
    if (fingers.current.size > 0 || drag.current === null) return;
    drag.current = null;
    if (dragged !== null) onChange(value.current, 'end');
    setDragged(null);
  };

  return { dragged, handlers: { onPointerDown, onPointerMove, onPointerUp, onPointerCancel: onPointerUp } };
}
