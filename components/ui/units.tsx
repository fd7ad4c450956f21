import { createContext, type PropsWithChildren, useContext, useMemo } from 'react';
import type { Preferences } from '@/contract';
import { defaultPreferences } from '@/hooks/default-preferences';

export interface Units {
  frequency: Preferences['frequencyUnit'];
  magnitude: Preferences['magnitudeUnit'];
  speed: Preferences['speedUnit'];
}

const UnitsContext = createContext<Units>({
  frequency: defaultPreferences.frequencyUnit,
  magnitude: defaultPreferences.magnitudeUnit,
  speed: defaultPreferences.speedUnit,
});

export function UnitsProvider({ preferences, children }: PropsWithChildren<{ preferences: Preferences }>) {
  const { frequencyUnit, magnitudeUnit, speedUnit } = preferences;
  const units = useMemo(
    () => ({ frequency: frequencyUnit, magnitude: magnitudeUnit, speed: speedUnit }),
    [frequencyUnit, magnitudeUnit, speedUnit],
  );
  return <UnitsContext.Provider value={units}>{children}</UnitsContext.Provider>;
}

/** The units that were chosen once in the account and hold everywhere. Values stay in rad/s, factors and m/s until they are shown. */
export const useUnits = (): Units => useContext(UnitsContext);
