import { describe, expect, it } from 'vitest';
import { controllerFacts, filterFacts } from '@/components/analyses/controller-facts';
import { Controller } from '@/contract';

const units = { input: 'kN·m', output: 'm/s' };
const facts = (controller: unknown) =>
  controllerFacts(Controller.parse(controller), units).map(({ name, value, aside }) => [name, value, aside].filter(Boolean).join(' '));

describe('the controller that an analysis was computed with', () => {
  it('stands in its own form, every number with its unit', () => {
    expect(facts({ form: 'parallel', kp: 1.05, ki: 0.42, kd: 0.3, derivativeFilterTime: 0.035, feedforward: { gain: 0.2 } })).toEqual([
      'Kp 1.05 kN·m/(m/s)',
      'Ki 0.42 kN·m/((m/s)·s)',
      'Kd 0.30 kN·m·s/(m/s)',
      'Tf 0.035 s',
      'Set-point weight b 1.00',
      'Set-point weight c 0.00',
      'Feedforward 0.20 kN·m/(m/s)',
    ]);
    expect(facts({ form: 'series', kp: 0.9, ti: 2.5, td: 0.3 }).slice(0, 3)).toEqual(['Kp 0.90 kN·m/(m/s)', 'Ti 2.50 s', 'Td 0.30 s']);
  });

  it('without integral action says so', () =>
    expect(facts({ form: 'ideal', kp: 1, ti: null, td: 0 })[1]).toBe('Ti none no integral action'));

  it('lists its filters in their order', () => {
    const filters = filterFacts(
      [
        { kind: 'notch', frequency: 40, depth: 0.1, width: 0.5 },
        { kind: 'lowPass', timeConstant: 0.02 },
      ],
      'rad/s',
    );
    expect(filters).toEqual([
      { name: 'Filter 1', value: 'Notch', aside: 'at 40.00 rad/s, depth 0.10, width 0.50' },
      { name: 'Filter 2', value: 'Low-pass', aside: 'time constant 0.02 s' },
    ]);
  });
});
