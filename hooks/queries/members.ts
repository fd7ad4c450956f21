import { infiniteQueryOptions, queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { AcceptedInvitation, Invitation, InviteMember, Member, OpenedInvitation, Role } from '@/contract';
import { staleTimes } from '../api/query-client';
import { request } from '../api/request';
import { type Page, query } from './page';
import { projectKey, projectsKey } from './projects';

const membersKey = (projectId: string) => [...projectKey(projectId), 'members'] as const;
const invitationsKey = (projectId: string) => [...projectKey(projectId), 'invitations'] as const;

export const membersQuery = (projectId: string) =>
  infiniteQueryOptions({
    queryKey: membersKey(projectId),
    queryFn: ({ pageParam }) => request<Page<Member>>('GET', `/projects/${projectId}/members${query({ cursor: pageParam, limit: '200' })}`),
    initialPageParam: null as string | null,
    getNextPageParam: (last) => last.nextCursor,
    select: (data) => data.pages.flatMap((page) => page.items),
  });

/** Invitations that wait: an owner's to see, anyone else is refused. */
export const invitationsQuery = (projectId: string) =>
  infiniteQueryOptions({
    queryKey: invitationsKey(projectId),
    queryFn: ({ pageParam }) =>
      request<Page<Invitation>>('GET', `/projects/${projectId}/invitations${query({ cursor: pageParam, limit: '200' })}`),
    initialPageParam: null as string | null,
    getNextPageParam: (last) => last.nextCursor,
    select: (data) => data.pages.flatMap((page) => page.items),
  });

/** People and history change with every member, so the whole project is asked for again, also where the change was refused. */
function useRefresh(projectId: string) {
  const client = useQueryClient();
  return () => client.invalidateQueries({ queryKey: projectKey(projectId) });
}

export function useInviteMember(projectId: string) {
  const onSettled = useRefresh(projectId);
  return useMutation({
    mutationFn: (invited: InviteMember) => request<Invitation>('POST', `/projects/${projectId}/members`, { body: invited }),
    onSettled,
  });
}

export function useGiveRole(projectId: string) {
  const onSettled = useRefresh(projectId);
  return useMutation({
    mutationFn: ({ member, role }: { member: Member; role: Role }) =>
      request<Member>('PATCH', `/projects/${projectId}/members/${member.userId}`, { body: { role }, ifMatch: member.etag }),
    onSettled,
  });
}

const endMembership = (projectId: string, { userId, etag }: Member) =>
  request<void>('DELETE', `/projects/${projectId}/members/${userId}`, { ifMatch: etag });

export function useRemoveMember(projectId: string) {
  const onSettled = useRefresh(projectId);
  return useMutation({ mutationFn: (member: Member) => endMembership(projectId, member), onSettled });
}

/** Ends one's own membership; the project is not theirs to read any more. */
export function useLeaveProject(projectId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (self: Member) => endMembership(projectId, self),
    onSuccess: () => {
      client.removeQueries({ queryKey: projectKey(projectId) });
      return client.invalidateQueries({ queryKey: projectsKey });
    },
    onError: () => client.invalidateQueries({ queryKey: projectKey(projectId) }),
  });
}

export function useResendInvitation(projectId: string) {
  const onSettled = useRefresh(projectId);
  return useMutation({
    mutationFn: (invitationId: string) => request<Invitation>('POST', `/projects/${projectId}/invitations/${invitationId}/resend`),
    onSettled,
  });
}

export function useTakeBackInvitation(projectId: string) {
  const onSettled = useRefresh(projectId);
  return useMutation({
    mutationFn: (invitationId: string) => request<void>('DELETE', `/projects/${projectId}/invitations/${invitationId}`),
    onSettled,
  });
}

/** What a mailed invitation says. Its token travels in a body: addresses end up in logs. */
export const openedInvitationQuery = (token: string) =>
  queryOptions({
    queryKey: ['invitation', token],
    staleTime: staleTimes.account,
    queryFn: () => request<OpenedInvitation>('POST', '/invitations/read', { body: { token } }),
  });

export function useAcceptInvitation() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (token: string) => request<AcceptedInvitation>('POST', '/invitations/accept', { body: { token } }),
    // The address is confirmed with it, so the account is asked for again as well.
    onSuccess: () => client.invalidateQueries(),
  });
}
