import { useWindowDimensions } from 'react-native';
import { breakpoints } from './tokens';

export type Layout = 'phone' | 'middle' | 'wide';

export const layoutOf = (width: number): Layout => (width >= breakpoints.wide ? 'wide' : width >= breakpoints.middle ? 'middle' : 'phone');

/** Which of the three layouts the window is wide enough for. */
export const useLayout = (): Layout => layoutOf(useWindowDimensions().width);
