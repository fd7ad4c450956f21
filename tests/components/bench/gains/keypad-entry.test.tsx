import { describe, expect, it } from 'vitest';
import { type Entry, entryOf, type KeypadKey, keypadKeyOf, pressed } from '@/components/bench/gains/keypad-entry';
import { readGain } from '@/components/bench/gains/read-gain';

const typed = (start: number, ...keys: KeypadKey[]): string => keys.reduce<Entry>(pressed, entryOf(start)).text;

describe('the keypad', () => {
  it('replaces the value that stood there with the first digit', () => expect(typed(1.05, '1', '.', '1')).toBe('1.1'));
  it('writes the zero before a leading point', () => expect(typed(1.05, '.', '5')).toBe('0.5'));
  it('takes one point', () => expect(typed(0, '1', '.', '2', '.', '3')).toBe('1.23'));
  it('changes the sign of the value that stood there, and back', () => {
    expect(typed(1.05, 'sign')).toBe('−1.05');
    expect(typed(-1.05, 'sign')).toBe('1.05');
  });
  it('erases the whole old value at once, and what was typed by one', () => {
    expect(typed(1.05, 'erase')).toBe('');
    expect(typed(1.05, '1', '2', 'erase')).toBe('1');
  });
  it('keeps the sign set before the digits', () => expect(typed(1, 'erase', 'sign', '2')).toBe('−2'));
  it('stops at twelve characters', () => expect(typed(0, ...Array<KeypadKey>(20).fill('9'))).toHaveLength(12));
  it('listens to a keyboard too', () => {
    expect(['7', '.', 'Backspace', '-', 'x'].map(keypadKeyOf)).toEqual(['7', '.', 'erase', 'sign', null]);
  });
});

describe('a typed gain', () => {
  it('is read with either minus', () => {
    expect(readGain('kp', 'parallel', '−0.25')).toEqual({ value: -0.25 });
    expect(readGain('kp', 'parallel', '-0.25')).toEqual({ value: -0.25 });
  });
  it('that is no number says how one looks', () =>
    expect(readGain('kp', 'parallel', '1.2.3')).toEqual({ problem: 'A number, as in 0.35.' }));
  it('may be negative, but not as a time', () => expect(readGain('filterTime', 'parallel', '-1')).toEqual({ problem: 'Tf is 0 or more.' }));
  it('may be 0 as a derivative time, not as an integral time: that says how integral action is switched off', () => {
    expect(readGain('derivative', 'ideal', '0')).toEqual({ value: 0 });
    expect(readGain('derivative', 'ideal', '-1')).toEqual({ problem: 'Td is 0 or more.' });
    for (const text of ['0', '', '-2'])
      expect(readGain('integral', 'series', text)).toEqual({ problem: 'Ti is more than 0. All settings switch integral action off.' });
    expect(readGain('integral', 'parallel', '0')).toEqual({ value: 0 });
  });
  it('is within what a design can hold', () => {
    expect(readGain('kp', 'parallel', '1e13')).toHaveProperty('problem');
    expect(readGain('filterTime', 'parallel', '2e6')).toHaveProperty('problem');
  });
});
