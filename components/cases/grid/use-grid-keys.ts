import { useRef, useState } from 'react';
import type { View } from 'react-native';

export interface GridSpot {
  readonly row: number;
  readonly column: number;
}

const moves: Readonly<Record<string, readonly [row: number, column: number]>> = {
  ArrowRight: [0, 1],
  ArrowLeft: [0, -1],
  ArrowDown: [1, 0],
  ArrowUp: [-1, 0],
};

const holds = (cells: readonly (readonly boolean[])[], { row, column }: GridSpot) => cells[row]?.[column] === true;

/** The next place in a direction that holds a case; the one it came from where there is none. */
export function nextSpot(cells: readonly (readonly boolean[])[], from: GridSpot, [rows, columns]: readonly [number, number]): GridSpot {
  let spot = { row: from.row + rows, column: from.column + columns };
  while (cells[spot.row]?.[spot.column] !== undefined) {
    if (holds(cells, spot)) return spot;
    spot = { row: spot.row + rows, column: spot.column + columns };
  }
  return from;
}

/** The first or last place of a row, or of the whole grid with Ctrl, that holds a case. */
export function endSpot(
  cells: readonly (readonly boolean[])[],
  from: GridSpot,
  { last, whole }: { last: boolean; whole: boolean },
): GridSpot {
  const spots = cells.flatMap((row, r) => (whole || r === from.row ? row.map((_, column) => ({ row: r, column })) : []));
  const filled = spots.filter((spot) => holds(cells, spot));
  return filled[last ? filled.length - 1 : 0] ?? from;
}

/** One stop for Tab; arrows walk the cells that hold a case, Home and End go to the ends, Enter and the space bar open. */
export function useGridKeys(cells: readonly (readonly boolean[])[], start: GridSpot) {
  const grid = useRef<View>(null);
  const [focused, setFocused] = useState<GridSpot | null>(null);
  const stop = focused !== null && holds(cells, focused) ? focused : start;
  const go = ({ row, column }: GridSpot) => {
    const element = grid.current as unknown as HTMLElement;
    element.querySelector<HTMLElement>(`[role=row][aria-rowindex="${row + 2}"] > [aria-colindex="${column + 2}"]`)?.focus();
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const last = event.key === 'End';
    const move = moves[event.key];
    if (event.key === ' ') {
      event.preventDefault();
      (event.target as HTMLElement).click();
    } else if (move) {
      event.preventDefault();
      go(nextSpot(cells, stop, move));
    } else if (last || event.key === 'Home') {
      event.preventDefault();
      go(endSpot(cells, stop, { last, whole: event.ctrlKey }));
    }
  };
  return { grid, stop, setFocused, onKeyDown };
}
