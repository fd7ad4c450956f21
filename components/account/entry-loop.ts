/** The loop shown before the gate: a car's speed loop at 30 km/h in continuous time, and where it comes nearest to −1. */

const plant = { gain: 2.28, drag: 0.0192, lag: 0.331, deadTime: 0.17 };
const gains = { kp: 1.05, ki: 0.42, kd: 0.3, filter: 0.035 };

interface PlanePoint {
  frequency: number;
  re: number;
  im: number;
}

/** L(jω) = P·C: magnitudes multiply, angles add. */
function loopAt(frequency: number): PlanePoint {
  const w = frequency;
  const derivative = (gains.kd * w) / (1 + (gains.filter * w) ** 2);
  const controller = { re: gains.kp + derivative * gains.filter * w, im: derivative - gains.ki / w };
  const magnitude = (plant.gain * Math.hypot(controller.re, controller.im)) / (Math.hypot(w, plant.drag) * Math.hypot(plant.lag * w, 1));
  const angle = Math.atan2(controller.im, controller.re) - Math.atan2(w, plant.drag) - Math.atan(plant.lag * w) - plant.deadTime * w;
  return { frequency: w, re: magnitude * Math.cos(angle), im: magnitude * Math.sin(angle) };
}

const LOWEST = 0.8;
const HIGHEST = 120;
const POINTS = 500;

const distance = ({ re, im }: PlanePoint) => Math.hypot(re + 1, im);

export const entryLoop = Array.from({ length: POINTS }, (_, i) => loopAt(LOWEST * (HIGHEST / LOWEST) ** (i / (POINTS - 1))));
export const nearestPoint = entryLoop.reduce((nearest, point) => (distance(point) < distance(nearest) ? point : nearest));
export const nearestMs = 1 / distance(nearestPoint);
