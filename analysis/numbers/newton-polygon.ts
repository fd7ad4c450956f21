import type { Complex } from './complex';

/** Irrational turn between starting points, so that none lies on an axis of symmetry. */
const OFFSET = 0.7;

/**
 * Starting points for all roots of a polynomial at once, on circles read off the upper convex hull of log|cₖ|.
 * They have the right magnitudes even where the roots spread over many decades.
 *
 * @param ascending coefficients from the constant term up; first and last are not zero
 * @see REFERENCES Bini 1996, section 3
 */
export const startingPoints = (ascending: readonly number[]): Complex[] => {
  const hull: number[] = [];
  const height = ascending.map((c) => (c === 0 ? -Infinity : Math.log(Math.abs(c))));
  const slope = (i: number, j: number) => (height[j] - height[i]) / (j - i);
  for (let k = 0; k < height.length; k += 1) {
    if (height[k] === -Infinity) continue;
    while (hull.length > 1 && slope(hull[hull.length - 2], hull[hull.length - 1]) <= slope(hull[hull.length - 1], k)) hull.pop();
    hull.push(k);
  }
  const points: Complex[] = [];
  for (let edge = 1; edge < hull.length; edge += 1) {
    const count = hull[edge] - hull[edge - 1];
    const radius = Math.exp(-slope(hull[edge - 1], hull[edge]));
    for (let k = 0; k < count; k += 1) {
      const angle = (2 * Math.PI * k) / count + OFFSET * edge + OFFSET / count;
      points.push({ re: radius * Math.cos(angle), im: radius * Math.sin(angle) });
    }
  }
  return points;
};
