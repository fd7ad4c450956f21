export { timeResponse, type KnownStability, type TimeResponseOptions } from './time-response';
