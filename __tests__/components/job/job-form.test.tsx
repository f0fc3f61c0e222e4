import { act, fireEvent, render, screen, waitFor } from '@testing-library/react';

import type { Job } from '@/api/contracts/job';
import { FieldUnitsProvider } from '@/components/forms/field-units';
import { JobForm } from '@/components/job/job-form';

import { Client } from '../../support/client';
import { fakeApi } from '../../support/fake-api';
import { contactInput, jobInput } from '../../support/job-inputs';

// a machine that builds beside the tests is slow, not wrong
jest.setTimeout(30_000);

const firm = {
  id: '16fd2706-8baf-433b-82eb-8c7fada847da',
  name: 'Firm',
  town: '',
  currency: 'EUR',
  locale: 'en-IE',
  paper: 'A4' as const,
  timeZone: 'Europe/Dublin',
};
const code = {
  id: 'ashrae-90.1-2019',
  title: 'ASHRAE 90.1-2019',
  pipes: { name: '', columns: [], bands: [], source: '', confidence: '' },
  end: 'upper' as const,
  endSource: '',
  endConfidence: '',
  ducts: null,
  footnotes: [],
  exemptions: [],
};
const clara = { ...contactInput, id: '3f2504e0-4f89-41d3-9a0c-0305e82c3301', version: 1 };
const stored: Job = { ...jobInput, id: '9b2c1f3e-2f44-4f2a-9d51-0d6b0d5f9a11', version: 7 };

async function show(job: Job | null) {
  const saved = jest.fn();
  const asked = fakeApi(({ method, path, body }) => {
    if (path === '/api/contacts') {
      return method === 'GET'
        ? { status: 200, body: [clara] }
        : { status: 201, body: { ...contactInput, ...asRow(body), id: firm.id, version: 1 } };
    }
    return { status: 200, body: { ...stored, ...asRow(body), version: 8 } };
  });
  const form = <JobForm job={job} firm={firm} codes={[code]} onSaved={saved} onCancel={jest.fn()} />;
  await act(async () => {
    render(
      <Client>
        <FieldUnitsProvider units="SI">{form}</FieldUnitsProvider>
      </Client>,
    );
  });
  const writes = (to: string) => asked.filter(({ method, path }) => method !== 'GET' && path.startsWith(to));
  return { saved, writes };
}
const asRow = (body: unknown) => (typeof body === 'object' ? body : {});
const field = (label: string | RegExp) => screen.getByLabelText<HTMLInputElement>(label);
const type = (label: string | RegExp, value: string) => fireEvent.change(field(label), { target: { value } });
const press = (text: string) => act(async () => void fireEvent.click(screen.getByText(text)));

it('begins with what the firm is used to, and says what is missing', async () => {
  const { writes } = await show(null);
  expect(field('Currency').value).toBe('EUR');
  await press('Open the job');
  for (const label of ['Number', 'Name', 'Climate zone', 'Above sea level']) {
    expect(field(label).getAttribute('aria-invalid')).toBe('true');
  }
  expect(writes('/api/jobs')).toHaveLength(0);
});

it('opens a job with its due date on the clock of the firm', async () => {
  const { writes, saved } = await show(null);
  type('Number', 'BLI-0500');
  type('Name', 'Boiler house');
  type('Climate zone', '4A');
  type('Above sea level', '120 ft');
  fireEvent.click(field('The bid has a due date'));
  type('Day', '2026-12-18');
  type('Time', '09:30');
  fireEvent.click(field(/^Clara Client/));
  await press('Open the job');
  await waitFor(() => expect(saved).toHaveBeenCalled());
  expect(writes('/api/jobs')[0]).toMatchObject({
    method: 'POST',
    body: {
      number: 'BLI-0500',
      bidDue: { date: '2026-12-18', time: '09:30', zone: 'Europe/Dublin' },
      contactIds: [clara.id],
      altitude: { typed: { text: '120', unit: 'ft' } },
      codeEdition: 'ashrae-90.1-2019',
      documentUnits: 'SI',
    },
  });
});

it('takes a new contact without losing what is filled in', async () => {
  const { writes, saved } = await show(stored);
  type('Name', 'Boiler house and chimney');
  await press('New contact');
  const dialog = screen.getAllByLabelText<HTMLInputElement>('Name').at(-1)!;
  fireEvent.change(dialog, { target: { value: 'Ivo Client' } });
  type('E-mail', 'ivo@client.example');
  await press('Save the contact');
  expect(writes('/api/contacts')).toHaveLength(1);
  await waitFor(() => expect(screen.queryByLabelText('E-mail')).toBeNull());
  await press('Save the job');
  await waitFor(() => expect(saved).toHaveBeenCalled());
  expect(writes('/api/jobs')[0]!.body).toMatchObject({
    version: 7,
    name: 'Boiler house and chimney',
    contactIds: [firm.id],
    altitude: jobInput.altitude,
  });
});

it('lets a date that is not given be no date', async () => {
  const { writes, saved } = await show(stored);
  fireEvent.click(field('The bid has a due date'));
  type(/^Date/, '');
  await press('Save the job');
  await waitFor(() => expect(saved).toHaveBeenCalled());
  expect(writes('/api/jobs')[0]!.body).toMatchObject({ bidDue: null, specification: { date: null } });
});
