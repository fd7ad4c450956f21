import type { Preferences } from '@/contract';

/** How it looks and counts before its reader is known. Apart from the schemas, which the first page does without. */
export const defaultPreferences: Preferences = {
  frequencyUnit: 'rad/s',
  magnitudeUnit: 'dB',
  speedUnit: 'm/s',
  theme: 'system',
  singleKeys: true,
};
