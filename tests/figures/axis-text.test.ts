import { describe, expect, it } from 'vitest';
import { axisFrom, axisIn, axisNumber, axisText, axisTyped, placeText } from '@/figures';

describe('a place on an axis', () => {
  it('is printed in the reader’s unit without idle zeros', () => {
    expect(axisText('speed', 30 / 3.6, 'km/h')).toBe('30 km/h');
    expect(axisText('speed', 30 / 3.6, 'm/s')).toBe('8.33 m/s');
    expect(axisText('mass', 1380, 'm/s')).toBe('1,380 kg');
    expect(axisText('grade', -2.5, 'm/s')).toBe('−2.5 %');
    expect(axisNumber('mass', 1000, 'm/s')).toBe('1,000');
    expect(axisNumber('speed', 0, 'km/h')).toBe('0');
  });

  it('comes back as it was typed', () => {
    for (const typed of ['30', '0.1', '240', '33.35'])
      expect(axisTyped('speed', axisFrom('speed', Number(typed), 'km/h'), 'km/h')).toBe(typed);
    expect(axisIn('mass', 1380, 'km/h')).toBe(1380);
  });

  it('names a case by what it has', () => {
    expect(placeText({ mass: 1380, speed: 30 / 3.6 }, 'km/h')).toBe('30 km/h, 1,380 kg');
    expect(placeText({}, 'km/h')).toBe('');
  });
});
