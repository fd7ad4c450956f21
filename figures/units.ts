import type { Preferences } from '@/contract';

export type FrequencyUnit = Preferences['frequencyUnit'];
export type MagnitudeUnit = Preferences['magnitudeUnit'];
export type SpeedUnit = Preferences['speedUnit'];

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

const KMH_PER_MS = 3.6;

/** m/s → the reader's unit. */
export const speedIn = (unit: SpeedUnit, metresPerSecond: number): number =>
  unit === 'km/h' ? metresPerSecond * KMH_PER_MS : metresPerSecond;

/** The reader's unit → m/s. */
export const speedFrom = (unit: SpeedUnit, value: number): number => (unit === 'km/h' ? value / KMH_PER_MS : value);
