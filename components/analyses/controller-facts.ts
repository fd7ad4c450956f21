import type { Fact } from '@/components/ui/fact-table';
import type { Controller, Filter } from '@/contract';
import { filterNames, filterText, formatGain, type FrequencyUnit, gainUnit, type PlantUnits } from '@/figures';

/** Gains, set-point weights and feedforward of a controller in its own form, with units. */
export function controllerFacts(controller: Controller, units: PlantUnits): Fact[] {
  const { kp, derivativeFilterTime, setpointWeights, feedforward } = controller;
  const fact = (label: Parameters<typeof gainUnit>[0], value: number): Fact => ({
    name: label,
    value: formatGain(value),
    aside: gainUnit(label, units),
  });
  const ownForm =
    controller.form === 'parallel'
      ? [fact('Ki', controller.ki), fact('Kd', controller.kd)]
      : [
          controller.ti === null ? { name: 'Ti', value: 'none', aside: 'no integral action' } : fact('Ti', controller.ti),
          fact('Td', controller.td),
        ];
  return [
    fact('Kp', kp),
    ...ownForm,
    fact('Tf', derivativeFilterTime),
    { name: 'Set-point weight b', value: formatGain(setpointWeights.proportional) },
    { name: 'Set-point weight c', value: formatGain(setpointWeights.derivative) },
    { name: 'Feedforward', value: formatGain(feedforward.gain), aside: gainUnit('Kp', units) },
  ];
}

/** The filters in their order, each with all that it is set to. */
export const filterFacts = (filters: readonly Filter[], unit: FrequencyUnit): Fact[] =>
  filters.map((filter, at) => ({ name: `Filter ${at + 1}`, value: filterNames[filter.kind], aside: filterText(filter, unit) }));
