import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { Invitation, InviteMember, Member, Role } from '@/contract';
import { request } from '../api/request';
import type { Page } from './page';
import { projectKey, projectsKey } from './projects';

export const membersQuery = (projectId: string) =>
  queryOptions({
    queryKey: [...projectKey(projectId), 'members'],
    queryFn: () => request<Page<Member>>('GET', `/projects/${projectId}/members?limit=200`).then((page) => page.items),
  });

/** Invitations that wait: an owner's to see, anyone else is refused. */
export const invitationsQuery = (projectId: string) =>
  queryOptions({
    queryKey: [...projectKey(projectId), 'invitations'],
    queryFn: () => request<Page<Invitation>>('GET', `/projects/${projectId}/invitations?limit=200`).then((page) => page.items),
  });

/** People and history change with every member, so the whole project is asked for again, also where the change was refused. */
function useRefresh(projectId: string) {
  const client = useQueryClient();
  return () => client.invalidateQueries({ queryKey: projectKey(projectId) });
}

export function useInvite(projectId: string) {
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

export function useTakeOut(projectId: string) {
  const onSettled = useRefresh(projectId);
  return useMutation({ mutationFn: (member: Member) => endMembership(projectId, member), onSettled });
}

/** Ends one's own membership; the project is not theirs to read any more. */
export function useLeave(projectId: string) {
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

export function useInviteAgain(projectId: string) {
  const onSettled = useRefresh(projectId);
  return useMutation({
    mutationFn: ({ id }: Invitation) => request<Invitation>('POST', `/projects/${projectId}/invitations/${id}/resend`),
    onSettled,
  });
}

export function useTakeBack(projectId: string) {
  const onSettled = useRefresh(projectId);
  return useMutation({
    mutationFn: ({ id }: Invitation) => request<void>('DELETE', `/projects/${projectId}/invitations/${id}`),
    onSettled,
  });
}
