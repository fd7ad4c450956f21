import { passwordRoutes } from './auth/password-routes';
import { signInRoutes } from './auth/sign-in-routes';
import { verificationRoutes } from './auth/verification-routes';
import { accountRoutes } from './account/account-routes';
import { activityRoutes } from './activity/activity-routes';
import { analysisRoutes } from './analyses/analysis-routes';
import { caseRoutes } from './cases/case-routes';
import { designRoutes } from './designs/design-routes';
import { judgeRoutes } from './analyses/judge-routes';
import { jobRoutes } from './jobs/job-routes';
import { limitRoutes } from './limits/limit-routes';
import type { Route } from './http/route';
import { loopRoutes } from './loops/loop-routes';
import { invitationRoutes } from './members/invitation-routes';
import { memberRoutes } from './members/member-routes';
import { plantRoutes } from './plants/plant-routes';
import { projectRoutes } from './projects/project-routes';
import { systemRoutes } from './system/system-routes';

/** Every route of the API; what is not listed here does not exist. */
export const routes: readonly Route[] = [
  ...systemRoutes,
  ...signInRoutes,
  ...passwordRoutes,
  ...verificationRoutes,
  ...accountRoutes,
  ...projectRoutes,
  ...memberRoutes,
  ...invitationRoutes,
  ...plantRoutes,
  ...designRoutes,
  ...caseRoutes,
  ...limitRoutes,
  ...analysisRoutes,
  ...judgeRoutes,
  ...jobRoutes,
  ...activityRoutes,
  ...loopRoutes,
];
