/**
 * Ascending frequencies from `low` to `high`: evenly spread in ln ω, and every landmark between.
 * @param landmarks ascending
 */
export const ladder = (
  low: number,
  high: number,
  { pointsPerDecade, landmarks }: { pointsPerDecade: number; landmarks: readonly number[] },
): number[] => {
  const steps = Math.max(1, Math.ceil(Math.log10(high / low) * pointsPerDecade));
  const step = Math.log(high / low) / steps;
  const all = [low];
  const add = (omega: number) => {
    if (omega > all[all.length - 1]) all.push(omega);
  };
  let next = 0;
  for (let k = 1; k <= steps; k += 1) {
    const omega = k === steps ? high : low * Math.exp(k * step);
    for (; next < landmarks.length && landmarks[next] < omega; next += 1) add(landmarks[next]);
    add(omega);
  }
  return all;
};
