const known: Readonly<Record<string, { label: string; unit?: string; hint: string }>> = {
  gainFactor: { label: 'Gain factor', hint: 'Times the plant’s own gain.' },
  deadTime: { label: 'Dead time', unit: 's', hint: 'In place of the plant’s own.' },
};

/** How a parameter of a case is asked for; a formula's own has no words but its name. */
export const parameterWords = (name: string): { label: string; unit?: string; hint: string } =>
  known[name] ?? { label: `Parameter ${name}`, hint: 'Of the plant’s formula.' };
