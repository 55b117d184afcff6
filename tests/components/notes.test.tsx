// @vitest-environment jsdom
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { cleanup, fireEvent, render, screen, waitFor, within } from '@testing-library/react';
import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import type { Note } from '@/analytics/notes/contract';
import { NotesList } from '@/components/notes/notes-list';
import { noteDays, notesOfMonth, numbered, wholeMonth } from '@/components/notes/numbered';
import { ViewerProvider, type ViewerSummary } from '@/components/viewer-context';
import { PERMISSIONS } from '@/lib/auth/permissions';
import type { Role } from '@/lib/vocabulary';

const note = (id: string, from: string, to: string, text: string): Note => ({
  id,
  from,
  to,
  text,
  writtenBy: 'Desmond Achterberg',
  writtenAt: '2026-07-12T10:00:00.000Z',
  version: 3,
});
const NOTES = numbered([
  note('a', '2026-02-01', '2026-02-28', 'Office closed'),
  note('b', '2026-06-28', '2026-07-10', 'Strike at the reclaimer'),
]);

const viewerAs = (role: Role): ViewerSummary => ({
  name: 'A',
  role,
  companyId: '1',
  companyName: 'B',
  timeZone: 'UTC',
  massUnit: 'lb',
  memberships: [],
  allowed: PERMISSIONS[role],
});

const sent = vi.fn<(path: string, init?: RequestInit) => Promise<Response>>();
beforeEach(() => vi.stubGlobal('fetch', sent));
afterEach(() => {
  cleanup();
  sent.mockReset();
  vi.unstubAllGlobals();
});

const show = (role: Role, draft: { from: string; to: string; text: string } | null = null) => {
  const done = vi.fn<() => void>();
  render(
    <QueryClientProvider client={new QueryClient()}>
      <ViewerProvider viewer={viewerAs(role)}>
        <NotesList notes={NOTES} draft={draft} onWrite={() => undefined} onDone={done} />
      </ViewerProvider>
    </QueryClientProvider>,
  );
  return done;
};

test('days are said as people say them', () => {
  expect(NOTES.map(noteDays)).toEqual(['February 2026', 'Jun 28, 2026 to Jul 10, 2026']);
  expect(noteDays({ from: '2026-07-03', to: '2026-07-03' })).toBe('Jul 3, 2026');
  expect(wholeMonth('2024-02')).toEqual({ from: '2024-02-01', to: '2024-02-29' });
  expect(notesOfMonth(NOTES, '2026-07').map(({ no }) => no)).toEqual([2]);
  expect(notesOfMonth(NOTES, '2026-05')).toEqual([]);
});

test('who may only read sees the notes with their numbers and no verbs', () => {
  show('office');
  const items = screen.getAllByRole('listitem').map(({ textContent }) => textContent);
  expect(items[1]).toContain('Note 2Jun 28, 2026 to Jul 10, 2026: Strike at the reclaimer');
  expect(screen.queryByRole('button')).toBeNull();
});

test('a note is changed in place, in the version that was read', async () => {
  sent.mockResolvedValue(Response.json({}));
  show('trainer');
  fireEvent.click(within(screen.getAllByRole('listitem')[1] as HTMLElement).getByRole('button', { name: 'Change' }));
  fireEvent.change(screen.getByLabelText('What is to be known'), { target: { value: 'Strike, now over' } });
  fireEvent.click(screen.getByRole('button', { name: 'Save the note' }));
  await waitFor(() => expect(screen.queryByLabelText('What is to be known')).toBeNull());
  const [path, init] = sent.mock.calls[0] ?? [];
  expect([path, init?.method]).toEqual(['/api/notes/b', 'PATCH']);
  expect(JSON.parse(String(init?.body))).toEqual({
    from: '2026-06-28',
    to: '2026-07-10',
    text: 'Strike, now over',
    version: 3,
  });
});

test('what the server refuses is said at its field, and nothing typed is lost', async () => {
  sent.mockResolvedValue(
    Response.json(
      {
        detail: 'to: The end lies before the beginning',
        errors: [{ path: 'to', message: 'The end lies before the beginning' }],
      },
      { status: 400 },
    ),
  );
  const done = show('owner', { from: '2026-07-10', to: '2026-07-01', text: '' });
  fireEvent.change(screen.getByLabelText('What is to be known'), { target: { value: 'New pumps' } });
  fireEvent.click(screen.getByRole('button', { name: 'Save the note' }));
  expect((await screen.findByRole('alert')).textContent).toBe('The end lies before the beginning');
  expect(screen.getByLabelText<HTMLTextAreaElement>('What is to be known').value).toBe('New pumps');
  expect(done).not.toHaveBeenCalled();
});

test('a note is taken away only after a second yes', async () => {
  sent.mockResolvedValue(Response.json({ id: 'a' }));
  show('owner');
  fireEvent.click(screen.getAllByRole('button', { name: 'Take away' })[0] as HTMLElement);
  expect(sent).not.toHaveBeenCalled();
  fireEvent.click(screen.getByRole('button', { name: 'Yes, take it away' }));
  await waitFor(() => expect(sent).toHaveBeenCalledTimes(1));
  expect(sent.mock.calls[0]?.[0]).toBe('/api/notes/a?version=3');
});
