import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { QueryView } from '@/components/ui/query-view';
import { ApiProblem, NoSignal } from '@/hooks/api/problem';

vi.mock('expo-router', () => ({ Link: ({ children }: { children: unknown }) => children }));

afterEach(cleanup);

const problem = (status: number, detail: string) => new ApiProblem({ type: 'about:blank', title: 'A problem', status, detail });
const idle = { data: undefined as string | undefined, error: null as Error | null, fetchStatus: 'idle' as const, refetch: () => undefined };

const show = (query: object, missing?: string) =>
  render(
    <QueryView query={{ ...idle, ...query }} waiting="Fetching" missing={missing}>
      {(text) => text}
    </QueryView>,
  );

describe('what is asked for', () => {
  it('is shown once it is there, and stays though asking again failed', () => {
    show({ data: 'the plant', error: problem(500, 'It broke.') });
    expect(screen.getByText('the plant')).toBeTruthy();
    expect(screen.queryByText('It broke.')).toBeNull();
  });

  it('says what went wrong and asks again', () => {
    const refetch = vi.fn();
    show({ error: problem(500, 'It broke.'), refetch });
    expect(screen.getByRole('alert').textContent).toContain('It broke.');
    fireEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(refetch).toHaveBeenCalledOnce();
  });

  it('says that there is no signal', () => {
    show({ error: new NoSignal() });
    expect(screen.getByRole('alert').textContent).toContain('No signal');
  });
});
