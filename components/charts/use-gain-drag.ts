import { useRef, useState } from 'react';
import type { PointerEvent } from 'react-native';
import { draggedGain, type GainScaleInput } from '@/figures';

export type GainChange = (value: number, phase: 'move' | 'end') => void;

interface Drag {
  /** The scale as it stood where the drag, or its finer part, began. */
  scale: GainScaleInput;
  from: number;
  value: number;
  fine: boolean;
}

/** Pixels before a press counts as a drag, so that a tap changes nothing. */
const SLOP = 3;

const capture = ({ currentTarget, nativeEvent }: PointerEvent): void => {
  const element = currentTarget as unknown as Partial<Element>;
  element.setPointerCapture?.(nativeEvent.pointerId);
};

/** Dragging the scale under its needle, with a second finger ten times finer. Every move is told at once, the end once more. */
export function useGainDrag(scale: GainScaleInput, onChange: GainChange) {
  const fingers = useRef(new Set<number>());
  const drag = useRef<Drag | null>(null);
  const [moving, setMoving] = useState(false);

  const onPointerDown = (event: PointerEvent) => {
    fingers.current.add(event.nativeEvent.pointerId);
    capture(event);
    drag.current ??= { scale, from: event.nativeEvent.clientX, value: scale.value, fine: false };
  };

  const onPointerMove = ({ nativeEvent }: PointerEvent) => {
    const now = drag.current;
    if (now === null || !fingers.current.has(nativeEvent.pointerId) || nativeEvent.pointerId !== Math.min(...fingers.current)) return;
    const fine = fingers.current.size > 1;
    if (fine !== now.fine) drag.current = { scale: { ...now.scale, value: now.value }, from: nativeEvent.clientX, value: now.value, fine };
    else {
      const dx = nativeEvent.clientX - now.from;
      if (!moving && Math.abs(dx) < SLOP) return;
      now.value = draggedGain(now.scale, dx, fine);
      setMoving(true);
      onChange(now.value, 'move');
    }
  };

  const onPointerUp = ({ nativeEvent }: PointerEvent) => {
    fingers.current.delete(nativeEvent.pointerId);
    if (fingers.current.size > 0 || drag.current === null) return;
    if (moving) onChange(drag.current.value, 'end');
    drag.current = null;
    setMoving(false);
  };

  return {
    moving,
    frozen: drag.current?.scale ?? null,
    handlers: { onPointerDown, onPointerMove, onPointerUp, onPointerCancel: onPointerUp },
  };
}
