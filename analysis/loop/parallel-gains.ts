import type { Loop } from '@/contract';
import type { ParallelGains } from './model';

type Controller = Loop['controller'];

/**
 * The exact parallel gains of a controller in any form. `ti` null means no integral action.
 *
 * ideal: kp, kp/ti, kp·td. Series: kp·(ti + td − tf)/ti, kp/ti, kp·(ti − tf)·(td − tf)/ti, with tf filtering the whole PI
 * also where td = 0. The filter time is the same in all forms.
 *
 * @see REFERENCES numerics "PID forms"
 * @example toParallelGains of series kp 2, ti 1, td 0.25, tf 0 // { kp: 2.5, ki: 2, kd: 0.5, filterTime: 0 }
 */
export const toParallelGains = (controller: Controller): ParallelGains => {
  const filterTime = controller.derivativeFilterTime;
  if (controller.form === 'parallel') return { kp: controller.kp, ki: controller.ki, kd: controller.kd, filterTime };
  const { form, kp, ti, td } = controller;
  if (form === 'ideal') return { kp, ki: ti === null ? 0 : kp / ti, kd: kp * td, filterTime };
  if (ti === null) return { kp, ki: 0, kd: kp * (td - filterTime), filterTime };
  return {
    kp: (kp * (ti + td - filterTime)) / ti,
    ki: kp / ti,
    kd: (kp * (ti - filterTime) * (td - filterTime)) / ti,
    filterTime,
  };
};
