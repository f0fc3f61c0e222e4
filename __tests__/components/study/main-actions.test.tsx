import { act, fireEvent, render, screen, waitFor } from '@testing-library/react';

import type { Run } from '@/api/contracts/run';
import { MainActions } from '@/components/study/main-actions';
import { ToastProvider } from '@/components/ui/toast';

import { Client } from '../../support/client';
import { fakeApi, type FakeAnswer } from '../../support/fake-api';
import { hotSteam, steamRow, steamRun } from '../../support/run-study';

const jobId = '7a1de6f5-2f43-4f5e-9d0f-bb6b0a3c4a09';
const standing = { specified: 4, chosen: 2, proposed: 6 };

function put(body: unknown): Run {
  // eslint-disable-next-line @typescript-eslint/consistent-type-assertions -- what the screen sent is what is looked at
  return (body as { put: Run[] }).put[0]!;
}
const saved = (body: unknown): FakeAnswer => ({
  status: 200,
  body: { put: [{ ...put(body), version: put(body).version + 1 }], dropped: [] },
});

async function show(selected: number, patched: (body: unknown) => FakeAnswer) {
  const asked = fakeApi(({ method, body }) => (method === 'PATCH' ? patched(body) : { status: 401, body: {} }));
  await act(
    async () =>
      void render(
        <Client>
          <ToastProvider>
            <MainActions
              of={{ jobId, run: steamRun, runStudy: hotSteam, row: steamRow }}
              standing={standing}
              selected={selected}
            />
          </ToastProvider>
        </Client>,
      ),
  );
  return () => asked.filter(({ method }) => method === 'PATCH');
}
const click = async (name: string | RegExp) => {
  const buttons = screen.getAllByRole('button', { name });
  await act(async () => void fireEvent.click(buttons.at(-1)!));
};
const type = (text: string) => fireEvent.change(screen.getByLabelText('Reason'), { target: { value: text } });

it('asks the reason of a thickness that departs, and writes it with the version that was seen', async () => {
  const patches = await show(6, saved);
  await click('Use 114 mm');
  expect(screen.getByText(/The specification \(P02\) has 76 mm here/)).toBeTruthy();
  await click('Use 114 mm');
  await waitFor(() => expect(screen.getByText('Must be filled in')).toBeTruthy());
  expect(patches()).toHaveLength(0);
  type('The code asks for it');
  await click('Use 114 mm');
  await waitFor(() => expect(screen.getByText('R30 is at 114 mm.')).toBeTruthy());
  expect(patches()[0]!.path).toBe(`/api/jobs/${jobId}/runs`);
  expect(put(patches()[0]!.body)).toMatchObject({
    id: steamRun.id,
    version: 4,
    override: { reason: 'The code asks for it', layers: [{ materialId: 'std/mf_pipe', thickness: 'in:4.5' }] },
  });
});

it('can be taken back', async () => {
  const patches = await show(6, saved);
  await click('Use 114 mm');
  type('The code asks for it');
  await click('Use 114 mm');
  await waitFor(() => expect(screen.getByRole('button', { name: 'Undo' })).toBeTruthy());
  await click('Undo');
  await waitFor(() => expect(patches()).toHaveLength(2));
  expect(put(patches()[1]!.body)).toMatchObject({ version: 5, override: steamRun.override });
});

it('goes back to the specified thickness without a reason', async () => {
  const patches = await show(4, saved);
  await click('Use 76 mm');
  await waitFor(() => expect(screen.getByText('R30 is at 76 mm, as specified.')).toBeTruthy());
  expect(put(patches()[0]!.body).override).toBeNull();
});

it('keeps what falls short, with the reason that stands already', async () => {
  await show(6, saved);
  await click('Keep 38 mm, with a reason');
  expect(screen.getByLabelText<HTMLTextAreaElement>('Reason').value).toBe('Drawn so');
});

it('says so when someone else was faster, and keeps what was typed', async () => {
  const stale = { type: '/problems/stale', title: 'Somebody else changed this first', status: 409, current: [] };
  await show(6, () => ({ status: 409, body: stale }));
  await click('Use 114 mm');
  type('The code asks for it');
  await click('Use 114 mm');
  await waitFor(() => expect(screen.getByText('Someone else changed R30 meanwhile')).toBeTruthy());
  expect(screen.getByLabelText<HTMLTextAreaElement>('Reason').value).toBe('The code asks for it');
});
