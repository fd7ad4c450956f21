import type { Rows } from '../row';
import { accountRows } from './account';
import { analysisRows } from './analyses';
import { caseRows } from './cases';
import { designRows } from './designs';
import { limitRows } from './limits';
import { loopRows } from './loops';
import { memberRows } from './members';
import { plantRows } from './plants';
import { projectRows } from './projects';
import { signInRows } from './sign-in';
import { systemRows } from './system';

/** A row for every route; one file per resource. */
export const rows: Rows = {
  ...systemRows,
  ...signInRows,
  ...accountRows,
  ...projectRows,
  ...memberRows,
  ...plantRows,
  ...designRows,
  ...caseRows,
  ...limitRows,
  ...analysisRows,
  ...loopRows,
};
