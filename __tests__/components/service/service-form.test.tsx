import { act, fireEvent, render, screen, waitFor } from '@testing-library/react';

import type { Service } from '@/api/contracts/service';
import { FieldUnitsProvider } from '@/components/forms/field-units';
import { ServiceForm } from '@/components/service/service-form';

import { Client } from '../../support/client';
import { fakeApi, type FakeAnswer } from '../../support/fake-api';
import { serviceInput } from '../../support/job-inputs';

// a machine that builds beside the tests is slow, not wrong
jest.setTimeout(30_000);

const jobId = '6f9619ff-8b86-4d01-b42d-00cf4fc964ff';
const roof = { id: '16fd2706-8baf-433b-82eb-8c7fada847da', name: 'Roof' };
const stored: Service = { ...serviceInput, id: '3f2504e0-4f89-41d3-9a0c-0305e82c3301', version: 2 };

async function show(service: Service | null, write?: () => FakeAnswer) {
  const saved = jest.fn();
  const asked = fakeApi(({ method, body }) => {
    if (method === 'GET') return { status: 404, body: {} };
    return write?.() ?? { status: 200, body: { ...stored, ...(typeof body === 'object' ? body : {}), version: 3 } };
  });
  const form = <ServiceForm jobId={jobId} service={service} position={4} places={[roof]} onSaved={saved} />;
  await act(async () => {
    render(
      <Client>
        <FieldUnitsProvider units="SI">{form}</FieldUnitsProvider>
      </Client>,
    );
  });
  const writes = () => asked.filter(({ method }) => method !== 'GET');
  return { saved, writes };
}
const field = (label: string | RegExp) => screen.getByLabelText<HTMLInputElement>(label);
const type = (label: string | RegExp, value: string) => fireEvent.change(field(label), { target: { value } });
const applies = (limit: RegExp) => field(limit).checked;
const save = () => act(async () => void fireEvent.click(screen.getByText('Save the service')));
const fill = () => {
  type('Name', 'Chilled water');
  type('What is in it', 'water');
  type('Operating', '6');
  type('Lowest', '5');
  type('Highest', '15');
  type('Hours a year', '5200');
};

describe('the limits of a new service', () => {
  it('are those that a hot one usually has, and follow when it is cold', async () => {
    await show(null);
    expect([applies(/^Touch/), applies(/^Dew point/), applies(/^Energy code/), applies(/^Material/)]).toEqual([
      true,
      false,
      true,
      true,
    ]);
    fireEvent.click(screen.getByText('Cold'));
    expect([applies(/^Touch/), applies(/^Dew point/)]).toEqual([false, true]);
    // the margin to begin with: METHOD, section 5, default 1 K
    expect(field('Above the dew point by at least').value).toBe('1');
  });

  it('stay as they were chosen, whatever the fluid is', async () => {
    await show(null);
    fireEvent.click(field(/^Material/));
    fireEvent.click(screen.getByText('Cold'));
    expect([applies(/^Touch/), applies(/^Material/)]).toEqual([true, false]);
  });

  it('offer only what is built', async () => {
    await show(null);
    const words = screen.getAllByRole('checkbox', { hidden: true });
    expect(words).toHaveLength(5);
  });
});

it('saves a cold service with its temperatures, limits and place in the schedule', async () => {
  const { writes, saved } = await show(null);
  fireEvent.click(screen.getByText('Cold'));
  fill();
  await save();
  await waitFor(() => expect(saved).toHaveBeenCalled());
  expect(writes()[0]).toMatchObject({
    method: 'POST',
    path: `/api/jobs/${jobId}/services`,
    body: {
      states: [{ nature: 'cold', operating: { value: 6 }, lowest: { value: 5 }, highest: { value: 15 } }],
      limits: [
        { kind: 'dew-point', placeId: null, margin: { value: 1 } },
        { kind: 'energy-code', placeId: null },
        { kind: 'material', placeId: null },
      ],
      position: 4,
    },
  });
});

it('refuses a lowest temperature above the operating one, at its field', async () => {
  const { writes } = await show(null);
  fill();
  type('Lowest', '8');
  fireEvent.blur(field('Lowest'));
  await save();
  await screen.findByText('Must not be above operating');
  expect(field('Lowest').getAttribute('aria-invalid')).toBe('true');
  expect(field('Lowest').value).toBe('8');
  expect(writes()).toHaveLength(0);
});

it('asks for both states of a service that is hot and cold in turn', async () => {
  const { writes, saved } = await show(stored);
  fireEvent.click(screen.getByText('Hot and cold in turn'));
  const lowest = screen.getAllByLabelText<HTMLInputElement>('Lowest');
  expect(lowest.map(({ value }) => value)).toEqual(['60', '']);
  const cold = (label: string, value: string) =>
    fireEvent.change(screen.getAllByLabelText(label)[1]!, { target: { value } });
  cold('Operating', '7');
  cold('Lowest', '6');
  cold('Highest', '12');
  await save();
  await waitFor(() => expect(saved).toHaveBeenCalled());
  expect(writes()[0]!.body).toMatchObject({
    version: 2,
    states: [
      { nature: 'hot', operating: { value: 82 } },
      { nature: 'cold', operating: { value: 7 } },
    ],
  });
});

it("puts the server's message beside the limit that it is about", async () => {
  const { saved } = await show(
    { ...stored, limits: [{ kind: 'heat-flow', placeId: null, perLength: null, flux: null }] },
    () => ({
      status: 400,
      body: {
        type: '/problems/invalid-input',
        title: 'Something is not filled in right',
        status: 400,
        fields: { 'limits.0.perLength': 'Give a limit for each metre or for each square metre' },
      },
    }),
  );
  await save();
  await screen.findByText('Give a limit for each metre or for each square metre');
  expect(field('For each length of pipe').getAttribute('aria-invalid')).toBe('true');
  expect(saved).not.toHaveBeenCalled();
});

it('takes a limit for one place only beside the one for everywhere', async () => {
  const { writes, saved } = await show({ ...stored, limits: [] });
  fireEvent.click(screen.getByText('Add a limit for one place only'));
  type('For each length of pipe', '20 Btu/h/ft');
  await save();
  await waitFor(() => expect(saved).toHaveBeenCalled());
  expect(writes()[0]!.body).toMatchObject({
    limits: [
      {
        kind: 'heat-flow',
        placeId: roof.id,
        perLength: { typed: { text: '20', unit: 'Btu/(h·ft)' } },
        flux: null,
      },
    ],
  });
});
