import { cleanup, fireEvent, screen, within } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { MembersScreen } from '@/components/members/members-screen';
import { fakeServer, invitation, member, refusal, renderInProject } from './in-project';

vi.mock('expo-router', () => ({
  Link: ({ children }: { children: unknown }) => children,
  useRouter: () => ({ replace: () => undefined }),
}));
vi.mock('expo-router/head', () => ({ default: () => null }));
// happy-dom knows no modal dialogs.
HTMLDialogElement.prototype.showModal = function showModal() {
  this.open = true;
};

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const people = { items: [member('mira', 'Mira Castellan', 'owner'), member('jonas', 'Jonas Abara', 'reviewer')], nextCursor: null };
const waiting = { items: [invitation], nextCursor: null };
const served = { 'GET /projects/p1/members': [200, people], 'GET /projects/p1/invitations': [200, waiting] } as const;

const roleOf = (name: string) => screen.findByRole('button', { name: new RegExp(`^Role of ${name}`) });

describe('the members’ page of an owner', () => {
  it('says why the only owner stays', async () => {
    fakeServer(served);
    renderInProject(<MembersScreen />);
    expect(((await roleOf('Mira Castellan')) as HTMLButtonElement).disabled).toBe(true);
    expect(screen.getByText('The only owner stays. Make someone else owner first.')).toBeTruthy();
    expect(screen.queryByRole('button', { name: 'Leave the project' })).toBeNull();
  });

  it('gives a role over the version of the member that was seen', async () => {
    const asked = fakeServer({ ...served, 'PATCH /projects/p1/members/jonas': [200, people.items[1]] });
    renderInProject(<MembersScreen />);
    fireEvent.click(await roleOf('Jonas Abara'));
    fireEvent.click(screen.getByRole('menuitem', { name: /^editor/ }));
    await vi.waitFor(() => expect(asked.some(({ method }) => method === 'PATCH')).toBe(true));
    expect(asked.find(({ method }) => method === 'PATCH')).toMatchObject({ body: { role: 'editor' }, ifMatch: '"jonas 1"' });
  });

  it('takes nobody out unasked, and says what was refused', async () => {
    const asked = fakeServer({ ...served, 'DELETE /projects/p1/members/jonas': refusal(412, 'Someone has changed this.') });
    renderInProject(<MembersScreen />);
    await roleOf('Jonas Abara');
    const take = screen.queryByRole('button', { name: 'Take Jonas Abara out' });
    if (take) fireEvent.click(take);
    else {
      fireEvent.click(await roleOf('Jonas Abara'));
      fireEvent.click(screen.getByRole('menuitem', { name: /^Take out/ }));
    }
    expect(asked.some(({ method }) => method === 'DELETE')).toBe(false);
    const dialog = await screen.findByRole('dialog', { name: /Take Jonas Abara out of/ });
    fireEvent.click(within(dialog).getByRole('button', { name: 'Take out' }));
    expect(await within(dialog).findByText('Someone has changed this.')).toBeTruthy();
  });

  it('shows an invitation with its dates, sends it again and takes it back', async () => {
    const asked = fakeServer({
      ...served,
      'POST /projects/p1/invitations/i1/resend': [200, invitation],
      'DELETE /projects/p1/invitations/i1': [204, null],
    });
    renderInProject(<MembersScreen />);
    fireEvent.click(await screen.findByRole('button', { name: `Send the invitation of ${invitation.email} again` }));
    expect(await screen.findByText(/Sent again/)).toBeTruthy();
    fireEvent.click(screen.getByRole('button', { name: `Take the invitation of ${invitation.email} back` }));
    await vi.waitFor(() => expect(asked.some(({ method }) => method === 'DELETE')).toBe(true));
  });
});

describe('the members’ page of anyone else', () => {
  it.each(['editor', 'reviewer', 'viewer'] as const)('offers a %s nothing but to leave', async (role) => {
    const items = [member('mira', 'Mira Castellan', role), { ...member('jonas', 'Jonas Abara', 'owner'), email: null }];
    const asked = fakeServer({ 'GET /projects/p1/members': [200, { items, nextCursor: null }] });
    renderInProject(<MembersScreen />, { role });
    expect(await screen.findByRole('button', { name: 'Leave the project' })).toBeTruthy();
    expect(screen.queryByRole('button', { name: /^Role of|Invite|Take .* out/ })).toBeNull();
    expect(asked.some(({ path }) => path.endsWith('/invitations'))).toBe(false);
  });

  it('shows who may do what, in words and not by dots alone', async () => {
    fakeServer(served);
    renderInProject(<MembersScreen />, { role: 'viewer' });
    const row = screen.getByRole('rowheader', { name: /Enter and change plants/ }).parentElement!;
    expect(
      within(row)
        .getAllByRole('cell')
        .map((cell) => cell.getAttribute('aria-label')),
    ).toEqual(['may', 'may', 'may not', 'may not']);
  });
});

describe('an archived project', () => {
  it('invites nobody and gives no role', async () => {
    fakeServer(served);
    renderInProject(<MembersScreen />, { archived: true });
    await screen.findByText('Jonas Abara');
    expect(screen.queryByRole('button', { name: /^Invite|^Role of|Send the invitation/ })).toBeNull();
  });
});
