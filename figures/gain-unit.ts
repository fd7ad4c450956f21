export interface PlantUnits {
  readonly input: string;
  readonly output: string;
}

/**
 * The unit of a gain, from those of the plant: command per output, over or times seconds, with one fraction bar outside brackets.
 * Times are in s. Empty where the plant names none.
 * @example gainUnit('Ki', { input: 'kN·m', output: 'm/s' }) // 'kN·m/((m/s)·s)'
 */
export function gainUnit(label: 'Kp' | 'Ki' | 'Kd' | 'Ti' | 'Td' | 'Tf', { input, output }: PlantUnits): string {
  if (label.startsWith('T')) return 's';
  if (!input || !output) return '';
  const per = /[/·]/.test(output) ? `(${output})` : output;
  const command = input.includes('/') ? `(${input})` : input;
  if (label === 'Kp') return `${command}/${per}`;
  return label === 'Ki' ? `${command}/(${per}·s)` : `${command}·s/${per}`;
}
