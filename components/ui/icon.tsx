import Svg, { Path } from 'react-native-svg';
import { useTheme } from './theme';
import type { Palette } from './tokens';

/** Each icon is a list of strokes in a 24 box; a stroke of its own width is a pair. */
type Stroke = string | readonly [path: string, width: number];

const icons = {
  back: ['M15 5l-7 7 7 7'],
  erase: ['M9 6h11v12H9l-6-6z', 'M12 9.500l5 5M17 9.500l-5 5'],
  next: ['M9 5l7 7-7 7'],
  down: ['M6 9l6 6 6-6'],
  undo: ['M8 5L4 9l4 4M4 9h10a5 5 0 015 5a5 5 0 01-5 5H9'],
  redo: ['M16 5l4 4-4 4M20 9H10a5 5 0 00-5 5a5 5 0 005 5h5'],
  pages: ['M4 6h16M4 12h16M4 18h10'],
  more: [
    ['M5 11h.01M5 13h.01M12 11h.01M12 13h.01M19 11h.01M19 13h.01', 1.2],
    ['M4 12h2M11 12h2M18 12h2', 3],
  ],
  minus: ['M6 12h12'],
  plus: ['M6 12h12M12 6v12'],
  close: ['M6 6l12 12M18 6L6 18'],
  home: ['M4 11l8-7 8 7v9H4z'],
  plant: ['M3 12h4M17 12h4M7 7h10v10H7z'],
  bench: ['M4 8h16M4 16h16', ['M9 5v6M15 13v6', 3]],
  cases: ['M4 4h16v16H4zM4 12h16M12 4v16'],
  limits: ['M3 17h13', ['M18 6v14', 4], 'M9 10v7'],
  list: ['M4 6h10M4 12h16M4 18h7'],
  account: ['M20.500 12a8.500 8.500 0 10-17 0a8.500 8.500 0 1017 0M8 13h8'],
  clock: ['M20.500 12a8.500 8.500 0 10-17 0a8.500 8.500 0 1017 0M12 7v5h4'],
  people: ['M3 6h8M3 12h8M3 18h8', ['M16 6h5M16 12h3M16 18h5', 3]],
  offline: ['M4 4l16 16M8 12a6 6 0 012-2M5 9a10 10 0 013-2M16 12a6 6 0 00-2-2M19 9a10 10 0 00-7-3M12 18h.01'],
} satisfies Record<string, readonly Stroke[]>;

export type IconName = keyof typeof icons;

/** A drawing beside a word or inside a labelled button; it is never the only name of anything. */
export function Icon({ name, size = 22, tone = 'ink' }: { name: IconName; size?: number; tone?: keyof Palette }) {
  const { colors } = useTheme();
  return (
    <Svg width={size} height={size} viewBox="0 0 24 24" aria-hidden>
      {(icons[name] as readonly Stroke[]).map((stroke) => {
        const [path, width] = typeof stroke === 'string' ? [stroke, 2] : stroke;
        return <Path key={path} d={path} fill="none" stroke={colors[tone]} strokeWidth={width} strokeLinecap="square" />;
      })}
    </Svg>
  );
}
