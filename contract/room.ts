import { z } from 'zod';
import { CaseRef } from './headline';
import { Quantity } from './common';

/** The first thing to break along one change of the loop. */
export const FirstBreak = z
  .object({
    amount: z.number().meta({ description: 'the change up to which everything holds, rounded towards none at all' }),
    quantity: Quantity.nullable().meta({ description: 'null: the loop is no longer stable' }),
    limit: z.number().nullable(),
    case: CaseRef,
  })
  .meta({ id: 'FirstBreak' });
export type FirstBreak = z.infer<typeof FirstBreak>;

const Way = z.object({
  lookedTo: z.number().meta({ description: 'the change up to which was looked' }),
  any: FirstBreak.nullable().meta({ description: 'the first limit to break; null: none as far as was looked' }),
  stability: FirstBreak.nullable().meta({ description: 'the first limit on a stability quantity to break' }),
  instability: FirstBreak.nullable().meta({ description: 'where the first case is no longer stable' }),
});
export type RoomWay = z.infer<typeof Way>;

/** What may change, one at a time, before something breaks in any case. */
export const Room = z
  .object({
    moreGain: Way.meta({ description: 'amounts are factors on the loop gain, 1 or more' }),
    lessGain: Way.meta({ description: 'amounts are factors on the loop gain, 1 or less' }),
    moreDeadTime: Way.meta({ description: 'amounts are s added to the dead time' }),
  })
  .meta({ id: 'Room' });
export type Room = z.infer<typeof Room>;
