import { authRoutes } from './auth/auth-routes';
import { accountRoutes } from './account/account-routes';
import type { Route } from './http/route';
import { systemRoutes } from './system/system-routes';

/** Every route of the API; what is not listed here does not exist. */
export const routes: readonly Route[] = [...systemRoutes, ...authRoutes, ...accountRoutes];
