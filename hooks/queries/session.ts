import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { SignIn, SignUp } from '@/contract';
import { request } from '../api/request';
import { meQuery, sessionsQuery } from './me';

/** What follows every sign-in: nothing of whoever was signed in before stays. */
function useEntry<Input>(path: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: Input) => request<unknown>('POST', path, { body: input }),
    onSuccess: async () => {
      client.clear();
      await client.fetchQuery(meQuery);
    },
  });
}

export const useSignIn = () => useEntry<SignIn>('/auth/sign-in/email');
export const useSignUp = () => useEntry<SignUp>('/auth/sign-up/email');

/** Ends with a fresh page, at sign-in or at `next`: nothing of the one who was signed in stays in memory. */
export const useSignOut = (next = '/sign-in') =>
  useMutation({
    mutationFn: () => request<unknown>('POST', '/auth/sign-out', { body: {} }),
    onSuccess: () => window.location.assign(next),
  });

export const useAskReset = () =>
  useMutation({
    mutationFn: (email: string) =>
      request<unknown>('POST', '/auth/request-password-reset', { body: { email, redirectTo: '/reset-password' } }),
  });

export const useResetPassword = () =>
  useMutation({
    mutationFn: (input: { token: string; newPassword: string }) => request<unknown>('POST', '/auth/reset-password', { body: input }),
  });

/** The other devices are signed out with it. */
export function useChangePassword() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: { currentPassword: string; newPassword: string }) =>
      request<unknown>('POST', '/auth/change-password', { body: { ...input, revokeOtherSessions: true } }),
    onSuccess: () => client.invalidateQueries(sessionsQuery),
  });
}

export const useSendVerification = () =>
  useMutation({
    mutationFn: (email: string) => request<unknown>('POST', '/auth/send-verification-email', { body: { email, callbackURL: '/verified' } }),
  });
