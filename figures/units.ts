import type { Preferences } from '@/contract';

export type FrequencyUnit = Preferences['frequencyUnit'];
export type MagnitudeUnit = Preferences['magnitudeUnit'];

const TURN = 2 * Math.PI;

/** rad/s → the reader's unit. */
export const frequencyIn = (unit: FrequencyUnit, radiansPerSecond: number): number =>
  unit === 'Hz' ? radiansPerSecond / TURN : radiansPerSecond;

/** The reader's unit → rad/s. */
export const frequencyFrom = (unit: FrequencyUnit, value: number): number => (unit === 'Hz' ? value * TURN : value);

/** 20·log10(factor); −∞ for 0. */
export const toDecibels = (factor: number): number => 20 * Math.log10(factor);

export const fromDecibels = (decibels: number): number => 10 ** (decibels / 20);

/** A factor in the reader's magnitude unit. */
export const magnitudeIn = (unit: MagnitudeUnit, factor: number): number => (unit === 'dB' ? toDecibels(factor) : factor);
