import { describe, expect, it } from 'vitest';
import { inUnits, rowOf, typed } from '@/components/limits/model/demand-row';
import { demandDigits, demandUnit } from '@/components/limits/model/demand-unit';
import type { Quantity } from '@/contract';

const decibels = { magnitude: 'dB', frequency: 'rad/s' } as const;
const factors = { magnitude: 'factor', frequency: 'Hz' } as const;

describe('a demand is shown again as it was typed', () => {
  it.each([
    ['gainMargin', '6', '6'],
    ['gainMargin', '6.02', '6.02'],
    ['gainMargin', '9.5424250944', '9.5424250944'],
    ['gainReduction', '-10', '−10'],
    ['noiseGain', '14.3', '14.3'],
    ['ms', '1.7', '1.70'],
    ['ms', '1,665', '1.665'],
    ['delayMargin', '.2', '0.20'],
    ['phaseMargin', '45', '45'],
    ['settlingTime', '6', '6'],
    ['bandwidth', '12.5', '12.5'],
  ] as const)('%s %s', (quantity, text, shown) => {
    const { value } = typed(text, quantity, decibels);
    expect(demandDigits(value!, demandUnit(quantity, decibels))).toBe(shown);
  });

  it('over a thousand demands in dB and in Hz, each kept as the contract keeps it', () => {
    const wrong: string[] = [];
    for (let i = 1; i <= 1000; i++) {
      const text = String(Number((i * 0.0137).toPrecision(6)));
      for (const [quantity, units] of [
        ['gainMargin', decibels],
        ['bandwidth', factors],
      ] as const) {
        const kept = JSON.parse(JSON.stringify(typed(text, quantity, units).value)) as number;
        if (demandDigits(kept, demandUnit(quantity, units)) !== text) wrong.push(`${quantity} ${text}`);
      }
    }
    expect(wrong).toEqual([]);
  });

  it('is a factor of 1.995… for 6 dB', () => {
    expect(typed('6', 'gainMargin', decibels).value).toBeCloseTo(1.9952623149688795, 15);
  });

  it('takes six figures where no short number means the same', () => {
    expect(demandDigits(1 / 1.7, demandUnit('modulusMargin', decibels))).toBe('0.588235');
  });
});

describe('a change of units', () => {
  const row = (quantity: Quantity, limit: number) => rowOf({ quantity, bound: 'min', limit, target: null, source: '' }, decibels);

  it('shows the same demand otherwise, and back as it was', () => {
    const sixDecibels = row('gainMargin', 10 ** (6 / 20));
    const [asFactor] = inUnits([sixDecibels], factors);
    expect(asFactor.limit.text).toBe('1.99526');
    expect(asFactor.limit.value).toBe(sixDecibels.limit.value);
    expect(inUnits([asFactor], decibels)[0].limit.text).toBe('6');
  });

  it('leaves alone what is no number', () => {
    const half = { ...row('gainMargin', 2), target: typed('sev', 'gainMargin', decibels) };
    expect(inUnits([half], factors)[0].target.text).toBe('sev');
  });
});
