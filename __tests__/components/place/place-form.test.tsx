import { act, fireEvent, render, screen, waitFor } from '@testing-library/react';

import type { UnitSystem } from '@/api/contracts/quantities';
import type { Place } from '@/api/contracts/place';
import { FieldUnitsProvider } from '@/components/forms/field-units';
import { PlaceForm } from '@/components/place/place-form';

import { Client } from '../../support/client';
import { fakeApi, type FakeAnswer } from '../../support/fake-api';
import { placeInput } from '../../support/job-inputs';

// a machine that builds beside the tests is slow, not wrong
jest.setTimeout(30_000);

const jobId = '6f9619ff-8b86-4d01-b42d-00cf4fc964ff';
const stored: Place = { ...placeInput, id: '3f2504e0-4f89-41d3-9a0c-0305e82c3301', version: 3 };

// The figures that the library gives for trained people, the public and vulnerable people: 60, 50 and 43 °C
// (ASHRAE Handbook Fundamentals 2021 ch.23; ISO 13732-1 from memory; UK HSE/NHS guidance from memory).
const start = (id: string, limit: number) => ({
  id,
  where: id,
  limit,
  basis: 'basis',
  source: 'source',
  confidence: 'high',
});
const safety = {
  touchDefaults: [
    start('trained-people-plant-rooms', 60),
    start('staff-areas', 55),
    start('public-reach', 50),
    start('vulnerable-people', 43),
  ],
  touchThresholds: [],
  notes: [],
};

type Answers = { write?: (body: unknown) => FakeAnswer };
async function show(place: Place | null, { write }: Answers = {}, units: UnitSystem = 'SI') {
  const saved = jest.fn();
  const asked = fakeApi(({ path, method, body }) => {
    if (method !== 'GET') return write?.(body) ?? { status: 200, body: { ...stored, ...asRow(body), version: 4 } };
    return path === '/api/library/safety' ? { status: 200, body: safety } : { status: 404, body: {} };
  });
  const form = (
    <PlaceForm jobId={jobId} place={place} ductLocations={[{ id: 'exterior', words: 'outdoors' }]} onSaved={saved} />
  );
  // the library is there before anything is typed
  await act(async () => {
    render(
      <Client>
        <FieldUnitsProvider units={units}>{form}</FieldUnitsProvider>
      </Client>,
    );
  });
  const writes = () => asked.filter(({ method }) => method !== 'GET');
  return { saved, writes };
}
const asRow = (body: unknown) => (typeof body === 'object' ? body : {});
const field = (label: string | RegExp) => screen.getByLabelText<HTMLInputElement>(label);
const type = (label: string | RegExp, value: string) => fireEvent.change(field(label), { target: { value } });
const save = () => act(async () => void fireEvent.click(screen.getByText('Save the place')));

describe('a new place', () => {
  it('says at each field what is missing, and sends nothing', async () => {
    const { writes } = await show(null);
    await save();
    await waitFor(() => expect(field('Name').getAttribute('aria-invalid')).toBe('true'));
    for (const label of ['Hottest: air', 'Most humid: humidity', 'Coldest: air', 'Mean: source']) {
      expect(field(label).getAttribute('aria-invalid')).toBe('true');
    }
    expect(writes()).toHaveLength(0);
  });

  it('offers the usual touch limit for who can reach it, which stays open to change', async () => {
    await show(null);
    fireEvent.click(screen.getByText('Trained people'));
    expect(field('Touch limit').value).toBe('60');
    fireEvent.click(screen.getByText('The public'));
    expect(field('Touch limit').value).toBe('50');
    fireEvent.click(screen.getByText('Use 43 °C'));
    expect(field('Touch limit').value).toBe('43');
    fireEvent.click(screen.getByText('Out of reach'));
    expect(screen.queryByLabelText('Touch limit')).toBeNull();
  });

  it('does not put the usual limit in place of one that the project set', async () => {
    await show({ ...stored, touchLimitSource: 'The owner asks for it' });
    await screen.findByText('Use 55 °C');
    fireEvent.click(screen.getByText('The public'));
    expect(field('Touch limit').value).toBe('60');
    expect(field('Who says so').value).toBe('The owner asks for it');
  });

  it('shows the dew point of the most humid air as it is typed', async () => {
    await show(null);
    type('Most humid: air', '28');
    type('Most humid: humidity', '75');
    // 28 °C at 75 %: dew point 23.2 °C, as in the job's own worked case (psychrometric chart)
    await waitFor(() => expect(screen.getByText('dew point 23.2 °C')).toBeTruthy());
  });

  it('puts one source where none is given, and leaves the others alone', async () => {
    await show(null);
    type('Hottest: source', 'Design note 4');
    type('Mean: source', 'Measured');
    fireEvent.click(screen.getByText(/first source/));
    expect(field('Coldest: source').value).toBe('Design note 4');
    expect(field('Mean: source').value).toBe('Measured');
  });
});

describe('a place that is changed', () => {
  it('keeps what was typed with its unit, and names the version that was seen', async () => {
    const { writes, saved } = await show(stored);
    type('Coldest: air', '50 °F');
    type('Coldest: wind', '3');
    await save();
    await waitFor(() => expect(saved).toHaveBeenCalled());
    expect(writes()[0]).toMatchObject({
      path: `/api/jobs/${jobId}/places/${stored.id}`,
      method: 'PATCH',
      body: {
        version: 3,
        conditions: {
          coldest: {
            air: { value: 10, typed: { text: '50', unit: '°F' } },
            wind: { value: 3, typed: { text: '3', unit: 'm/s' } },
          },
        },
      },
    });
  });

  it('shows the same values in inch-pound units and sends them back untouched', async () => {
    const { writes, saved } = await show(stored, {}, 'IP');
    expect(field('Touch limit').value).toBe('140');
    expect(field('Hottest: air').value).toBe('104');
    type(/^Note/, 'Damp');
    await save();
    await waitFor(() => expect(saved).toHaveBeenCalled());
    expect(writes()[0]!.body).toMatchObject({ touchLimit: placeInput.touchLimit, conditions: placeInput.conditions });
  });

  it("puts the server's messages beside their fields and keeps what was typed", async () => {
    const problem = {
      type: '/problems/invalid-input',
      title: 'Something is not filled in right',
      status: 400,
      fields: { name: 'Another place of this job has it already' },
    };
    await show(stored, { write: () => ({ status: 400, body: problem }) });
    type('Name', 'Roof');
    await save();
    await screen.findByText('Another place of this job has it already');
    expect(field('Name').value).toBe('Roof');
    expect(field('Name').getAttribute('aria-invalid')).toBe('true');
  });

  it('says so when there is no connection, and loses nothing', async () => {
    const { saved } = await show(stored, { write: () => 'no network' });
    type('Name', 'Roof');
    await save();
    await screen.findByText(/No connection/);
    expect(field('Name').value).toBe('Roof');
    expect(saved).not.toHaveBeenCalled();
  });
});

describe('a place that someone else changed meanwhile', () => {
  const theirs: Place = { ...stored, version: 4, name: 'Boiler room', note: 'Very damp' };
  const stale = { type: '/problems/stale', title: 'Somebody else changed this first', status: 409, current: theirs };

  it('takes over what only they changed, shows where both differ, and saves on what is stored now', async () => {
    let tries = 0;
    const { writes, saved } = await show(stored, {
      write: (body) =>
        ++tries === 1 ? { status: 409, body: stale } : { status: 200, body: { ...theirs, ...asRow(body), version: 5 } },
    });
    type('Name', 'Plant room 2');
    await save();
    await screen.findByText('Somebody else changed this first');
    // both changed the name: theirs and mine stand side by side; only they changed the note: it is in the form
    expect(screen.getByText('Stored now: Boiler room')).toBeTruthy();
    expect(screen.getByText('Yours: Plant room 2')).toBeTruthy();
    expect(field('Name').value).toBe('Plant room 2');
    expect(field(/^Note/).value).toBe('Very damp');
    await save();
    await waitFor(() => expect(saved).toHaveBeenCalled());
    expect(writes()[1]!.body).toMatchObject({ version: 4, name: 'Plant room 2', note: 'Very damp' });
    expect(screen.queryByText('Take theirs instead')).toBeNull();
  });

  it('gives way to theirs when that is asked', async () => {
    await show(stored, { write: () => ({ status: 409, body: stale }) });
    type('Name', 'Plant room 2');
    await save();
    fireEvent.click(await screen.findByText('Take theirs instead'));
    await waitFor(() => expect(field('Name').value).toBe('Boiler room'));
    expect(screen.queryByText('Take theirs instead')).toBeNull();
  });
});
