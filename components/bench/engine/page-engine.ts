import type { Engine } from './engine';
import { doTask } from './engine-tasks';

/** The engine in the page itself, for where there are no workers: each task in a turn of its own, so that the page goes on between two. */
export const pageEngine: Engine = {
  run: (name, input) =>
    new Promise((resolve, reject) => {
      setTimeout(() => {
        try {
          resolve(doTask(name, input));
        } catch (error) {
          reject(error);
        }
      }, 0);
    }),
};
