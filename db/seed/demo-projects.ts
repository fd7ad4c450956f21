import { pitLane } from './demo-pit-lane';
import type { DemoProject } from './demo-project';
import { speedHold } from './demo-speed-hold';
import { rearAxleTorque } from './demo-torque';

/** The oldest first, so that the newest stands on top of the list. */
export const demoProjects: readonly DemoProject[] = [rearAxleTorque, pitLane, speedHold];
