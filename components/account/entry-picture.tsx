import Svg, { Circle, G, Line, Path, Text as SvgText } from 'react-native-svg';
import { useTheme } from '@/components/ui/theme';
import { fonts } from '@/components/ui/tokens';
import { formatFactor, formatFrequency } from '@/figures/format';
import { circleKerb } from '@/figures/kerb';
import { contourLevels, contourRadius } from '@/figures/sensitivity-contours';
import { entryLoop, nearestMs, nearestPoint } from './entry-loop';

const SCALE = 323;
const LIMIT = 1.7;
/** What is seen of the plane: the whole, and on a phone the place where the loop comes nearest. */
const views = { whole: '-660 -370 940 920', near: '-330 -60 390 150' };

const at = ({ re, im }: { re: number; im: number }) => ({ x: re * SCALE, y: -im * SCALE });
const summit = at({ re: -1, im: 0 });
const nearest = at(nearestPoint);
const curve = entryLoop.map((point, i) => `${i === 0 ? 'M' : 'L'}${at(point).x.toFixed(1)} ${at(point).y.toFixed(1)}`).join('');
const kerb = circleKerb(contourRadius(LIMIT) * SCALE);
const contours = [...contourLevels.fine, ...contourLevels.strong];

/** A loop on the contours of |S|, and the kerb round −1: what the product is about, computed like everything else in it. */
export function EntryPicture({ view = 'whole' }: { view?: keyof typeof views }) {
  const { colors } = useTheme();
  const label = { fontFamily: fonts.narrow[600], fontSize: 13, fill: colors.ink };
  return (
    <Svg
      width="100%"
      height="100%"
      viewBox={views[view]}
      preserveAspectRatio="xMidYMid slice"
      role="img"
      aria-label={`A loop's Nyquist curve on contours of the sensitivity. It comes nearest to −1 with Ms ${formatFactor(nearestMs)}, just outside the kerb at ${formatFactor(LIMIT)}.`}
    >
      {contourLevels.shaded.map((level) => (
        <Circle key={level} cx={summit.x} cy={0} r={contourRadius(level) * SCALE} fill={colors.contour} fillOpacity={0.07} />
      ))}
      {contours.map((level) => (
        <Circle key={level} cx={summit.x} cy={0} r={contourRadius(level) * SCALE} fill="none" stroke={colors.contour} strokeWidth={1} />
      ))}
      <Line x1={-2000} x2={2000} y1={0} y2={0} stroke={colors.rule2} />
      <Line x1={0} x2={0} y1={-2000} y2={2000} stroke={colors.rule2} />
      <Circle cx={0} cy={0} r={SCALE} fill="none" stroke={colors.rule2} strokeDasharray="2 4" />
      <G fill="none">
        <Circle cx={summit.x} cy={0} r={kerb.middle} stroke={colors.kerbGap} strokeWidth={kerb.width} />
        <Circle cx={summit.x} cy={0} r={kerb.middle} stroke={colors.kerb} strokeWidth={kerb.width} strokeDasharray={kerb.dash} />
        <Circle cx={summit.x} cy={0} r={contourRadius(LIMIT) * SCALE} stroke={colors.kerb} strokeWidth={1.5} />
        <Path d={curve} stroke={colors.ink} strokeWidth={2.25} strokeLinejoin="round" />
      </G>
      <Line x1={summit.x} y1={0} x2={nearest.x} y2={nearest.y} stroke={colors.ink} strokeWidth={1.5} />
      <Path d={`M${summit.x} -7l6 11h-12z`} fill={colors.ink} />
      <Circle cx={nearest.x} cy={nearest.y} r={5.5} fill={colors.ink} stroke={colors.paper} strokeWidth={1.5} />
      <Line x1={nearest.x + 8} y1={nearest.y + 3} x2={14} y2={nearest.y + 40} stroke={colors.ink3} />
      <SvgText {...label} x={20} y={nearest.y + 42}>
        {`Ms ${formatFactor(nearestMs)}`}
      </SvgText>
      <SvgText {...label} fontFamily={fonts.narrow[500]} fill={colors.ink2} x={20} y={nearest.y + 59}>
        {`${formatFrequency(nearestPoint.frequency, 'rad/s')} rad/s`}
      </SvgText>
    </Svg>
  );
}
