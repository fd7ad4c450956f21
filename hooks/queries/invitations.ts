import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { AcceptedInvitation, OpenedInvitation } from '@/contract';
import { staleTimes } from '../api/query-client';
import { request } from '../api/request';
import { meQuery } from './me';
import { projectsKey } from './projects';

/** What a mailed invitation says. Its token travels in a body: addresses end up in logs. */
export const openedInvitationQuery = (token: string) =>
  queryOptions({
    queryKey: ['invitation', token],
    staleTime: staleTimes.account,
    queryFn: () => request<OpenedInvitation>('POST', '/invitations/read', { body: { token } }),
  });

/** Joins the project. The address is confirmed with it, so the account is asked for again as well. */
export function useAcceptInvitation(token: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => request<AcceptedInvitation>('POST', '/invitations/accept', { body: { token } }),
    onSuccess: () => Promise.all([client.invalidateQueries({ queryKey: projectsKey }), client.invalidateQueries(meQuery)]),
  });
}
