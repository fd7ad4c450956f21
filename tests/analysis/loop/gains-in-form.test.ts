import { assert, constant, double, oneof, property, record } from 'fast-check';
import { describe, expect, it } from 'vitest';
import { gainsInForm, toParallelGains, type ParallelGains } from '@/analysis';
import type { Controller } from '@/contract';

const shared = { setpointWeights: { proportional: 1, derivative: 0 }, feedforward: { gain: 0 }, filters: [] };

function back(gains: ParallelGains, form: 'ideal' | 'series'): ParallelGains | string {
  const written = gainsInForm(gains, form);
  if ('refusal' in written) return written.refusal;
  const { kp, ti, td, filterTime } = written.gains;
  return toParallelGains({ form, kp, ti, td, derivativeFilterTime: filterTime, ...shared } satisfies Controller);
}

/** C(jω) in parallel form. */
function value({ kp, ki, kd, filterTime }: ParallelGains, omega: number) {
  const bend = 1 + (omega * filterTime) ** 2;
  return { re: kp + (kd * omega * omega * filterTime) / bend, im: (kd * omega) / bend - ki / omega };
}

const positive = double({ min: 1e-3, max: 1e3, noNaN: true });
const gains = record({
  kp: positive,
  ki: positive,
  kd: oneof(constant(0), positive),
  filterTime: oneof(constant(0), double({ min: 1e-4, max: 1, noNaN: true })),
});

describe('gains in another form', () => {
  it('writes the worked example of the series form back', () => {
    expect(gainsInForm({ kp: 2.5, ki: 2, kd: 0.5, filterTime: 0 }, 'series')).toEqual({ gains: { kp: 2, ti: 1, td: 0.25, filterTime: 0 } });
  });

  it('leaves the controller the same at every frequency, wherever the form can say it', () => {
    let written = 0;
    assert(
      property(gains, double({ min: 1e-3, max: 1e3, noNaN: true }), (parallel, omega) => {
        for (const form of ['ideal', 'series'] as const) {
          const again = back(parallel, form);
          if (typeof again === 'string') continue;
          written += 1;
          const a = value(parallel, omega);
          const b = value(again, omega);
          const scale = Math.abs(parallel.kp) + Math.abs(parallel.ki / omega) + Math.abs(parallel.kd * omega);
          expect(Math.hypot(a.re - b.re, a.im - b.im)).toBeLessThanOrEqual(1e-9 * scale);
        }
      }),
      { seed: 20261201, numRuns: 400 },
    );
    expect(written).toBeGreaterThan(400);
  });

  it('takes the larger time as Ti', () => {
    const written = gainsInForm({ kp: 3, ki: 1, kd: 0.5, filterTime: 0.1 }, 'series');
    expect('gains' in written && written.gains.ti! >= written.gains.td).toBe(true);
  });

  it('drops a filter time that has no effect rather than let it filter the whole PI', () => {
    expect(gainsInForm({ kp: 2, ki: 1, kd: 0, filterTime: 0.3 }, 'series')).toEqual({ gains: { kp: 2, ti: 2, td: 0, filterTime: 0 } });
  });

  it('needs no integral action', () => {
    expect(back({ kp: 2, ki: 0, kd: 0.5, filterTime: 0.1 }, 'series')).toEqual({
      kp: 2,
      ki: 0,
      kd: expect.closeTo(0.5, 12),
      filterTime: 0.1,
    });
    expect(gainsInForm({ kp: 2, ki: 0, kd: 0, filterTime: 0 }, 'ideal')).toEqual({ gains: { kp: 2, ti: null, td: 0, filterTime: 0 } });
  });

  it('writes a brake loop, whose gains are all negative', () => {
    expect(back({ kp: -2.5, ki: -2, kd: -0.5, filterTime: 0 }, 'series')).toEqual({ kp: -2.5, ki: -2, kd: -0.5, filterTime: 0 });
  });

  it.each([
    ['a complex pair of zeros', { kp: 1, ki: 1, kd: 1, filterTime: 0 }, 'series', /complex pair/],
    ['a zero in the right half-plane', { kp: -1, ki: 1, kd: 0, filterTime: 0 }, 'series', /left half-plane/],
    ['no proportional gain', { kp: 0, ki: 1, kd: 0, filterTime: 0 }, 'ideal', /proportional/],
    ['gains of both signs', { kp: 1, ki: -1, kd: 0, filterTime: 0 }, 'ideal', /negative/],
  ] as const)('refuses %s', (_what, parallel, form, reason) => {
    expect(gainsInForm(parallel, form)).toEqual({ refusal: expect.stringMatching(reason) });
  });
});
