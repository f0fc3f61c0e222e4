import { act, fireEvent, render, screen, waitFor } from '@testing-library/react';
import type { ReactNode } from 'react';

import type { BuildUp, SpecificationRow } from '@/api/contracts/build-up';
import type { LibraryFinish, LibraryMaterial, LibrarySeries } from '@/api/contracts/library';
import type { Service } from '@/api/contracts/service';
import { BuildUpForm } from '@/components/build-up/build-up-form';
import type { CoveringChoices } from '@/components/build-up/covering-fields';
import { FieldUnitsProvider } from '@/components/forms/field-units';
import { SpecificationForm } from '@/components/specification/specification-form';

import { Client } from '../../support/client';
import { fakeApi } from '../../support/fake-api';
import { serviceInput } from '../../support/job-inputs';

// the drawings are a chunk of their own, which a test's document cannot fetch
jest.mock('@/components/drawing/drawn', () => jest.requireActual('../../support/drawn'));

// a machine that builds beside the tests is slow, not wrong
jest.setTimeout(30_000);

const jobId = '6f9619ff-8b86-4d01-b42d-00cf4fc964ff';
const service: Service = { ...serviceInput, id: '3f2504e0-4f89-41d3-9a0c-0305e82c3301', version: 1 };
const place = { id: '16fd2706-8baf-433b-82eb-8c7fada847da', name: 'Roof' };

const origin = { source: 'A table', confidence: 'high' };
const material = (id: string, name: string, series: string[]): LibraryMaterial => ({
  id: `std/${id}`,
  name,
  standards: '',
  useType: '',
  curve: { kind: 'max', points: [[24, 0.035]], ...origin },
  otherCurves: [],
  useMinimum: null,
  useMinimumSource: '',
  useMaximum: null,
  useMaximumSource: '',
  closedCell: false,
  flameSmoke: null,
  conductivityTolerance: null,
  series,
  notes: [],
});
const series = (id: string, names: LibrarySeries['names'], installed: number | null = null): LibrarySeries => ({
  id,
  title: id,
  form: 'section',
  unit: 'in',
  names,
  tables: 'none',
  installed,
  sizes: '',
  note: '',
  ...origin,
});
const finish: LibraryFinish = {
  id: 'std/pvc-jacket',
  name: 'PVC jacket',
  kind: 'plastic',
  bare: false,
  emittanceNew: 0.9,
  emittanceAged: 0.9,
  emittanceRange: [0.9, 0.9],
  maximum: null,
  maximumSource: '',
  ...origin,
};
const bare = { ...finish, id: 'std/bare-steel', name: 'Bare steel', bare: true };
const materials = [
  material('mf_pipe', 'Mineral fibre pipe section', ['sections']),
  material('mf_blanket_wrap', 'Duct wrap', ['wrap']),
];
const choices: CoveringChoices = {
  names: {
    units: 'SI',
    services: [service],
    places: [place],
    materials,
    finishes: [finish],
    // DN and NPS of ASME B36.10M
    sizes: [
      { dn: 50, nominal: 'NPS 2', outsideDiameter: 0.0603 },
      { dn: 100, nominal: 'NPS 4', outsideDiameter: 0.1143 },
    ],
  },
  library: {
    materials,
    series: [series('sections', ['in:1', 'in:2']), series('wrap', ['in:1.5'], 0.75)],
    units: 'SI',
    seriesUnit: 'in',
  },
  finishes: [finish, bare],
  services: [service],
};

async function show(form: (saved: () => void) => ReactNode, row: BuildUp | SpecificationRow) {
  const saved = jest.fn();
  const asked = fakeApi(({ method, body }) =>
    method === 'GET'
      ? { status: 404, body: {} }
      : { status: 200, body: { ...row, ...(typeof body === 'object' ? body : {}), version: 2 } },
  );
  await act(async () => {
    render(
      <Client>
        <FieldUnitsProvider units="SI">{form(saved)}</FieldUnitsProvider>
      </Client>,
    );
  });
  const writes = () => asked.filter(({ method }) => method !== 'GET');
  return { saved, writes };
}
const save = (button: string) => act(async () => void fireEvent.click(screen.getByText(button)));
const pick = (label: string, value: string, at = 0) =>
  fireEvent.change(screen.getAllByLabelText(label)[at]!, { target: { value } });
const optionsOf = (label: string) =>
  [...screen.getByLabelText<HTMLSelectElement>(label).options].map(({ text }) => text);

const layer = (thickness: 'in:1' | 'in:2' | null) => ({ materialId: 'std/mf_pipe', thickness, installed: null });
const buildUp: BuildUp = {
  id: '9b2c1f3e-2f44-4f2a-9d51-0d6b0d5f9a11',
  version: 1,
  serviceId: service.id,
  appliesTo: 'pipe',
  placeIds: [],
  fromDn: null,
  toDn: null,
  layers: [layer(null)],
  finishId: finish.id,
  vapourRetarder: 'none',
  note: '',
};
const row: SpecificationRow = { ...buildUp, label: 'P01', layers: [layer('in:2')] };

describe('a build-up', () => {
  const showBuildUp = () =>
    show((saved) => <BuildUpForm jobId={jobId} buildUp={buildUp} choices={choices} onSaved={saved} />, buildUp);

  it('leaves the outermost thickness to the study, and asks for the ones inside', async () => {
    const { writes, saved } = await showBuildUp();
    expect(screen.queryByLabelText('Thickness')).toBeNull();
    fireEvent.click(screen.getByText('Add a layer over it'));
    pick('Material', 'std/mf_pipe', 1);
    await save('Save the build-up');
    await screen.findByText('Must be chosen: only the outermost layer is left to the study');
    expect(writes()).toHaveLength(0);
    pick('Thickness', 'in:2');
    await save('Save the build-up');
    await waitFor(() => expect(saved).toHaveBeenCalled());
    expect(writes()[0]!.body).toMatchObject({ version: 1, layers: [layer('in:2'), layer(null)] });
  });

  it('opens the thickness again when the layer over it is taken out', async () => {
    const { writes, saved } = await showBuildUp();
    fireEvent.click(screen.getByText('Add a layer over it'));
    pick('Thickness', 'in:2');
    fireEvent.click(screen.getAllByText('Take it out')[1]!);
    await save('Save the build-up');
    await waitFor(() => expect(saved).toHaveBeenCalled());
    expect(writes()[0]!.body).toMatchObject({ layers: [layer(null)] });
  });

  it('refuses a band that ends before it begins', async () => {
    const { writes } = await showBuildUp();
    pick('From size', '100');
    pick('To size', '50');
    await save('Save the build-up');
    await screen.findByText('Must not be smaller than the first size');
    expect(writes()).toHaveLength(0);
  });

  it('forgets the band of sizes where it applies to ducts', async () => {
    const { writes, saved } = await showBuildUp();
    pick('From size', '50');
    fireEvent.click(screen.getByText('Ducts'));
    expect(screen.queryByLabelText('From size')).toBeNull();
    await save('Save the build-up');
    await waitFor(() => expect(saved).toHaveBeenCalled());
    expect(writes()[0]!.body).toMatchObject({ appliesTo: 'duct', fromDn: null, toDn: null });
  });
});

describe('a specification row', () => {
  const showRow = (of: SpecificationRow | null = row) =>
    show((saved) => <SpecificationForm jobId={jobId} row={of} label="P02" choices={choices} onSaved={saved} />, row);

  it('names each thickness, made in the material first, both ways of saying it', async () => {
    await showRow();
    expect(optionsOf('Thickness')).toEqual(['25 mm, 1 in', '51 mm, 2 in', '38 mm, 1-1/2 in']);
    expect(optionsOf('From size')).toEqual(['The smallest', 'DN 50, NPS 2', 'DN 100, NPS 4']);
  });

  it('draws what is entered as soon as every layer has its thickness', async () => {
    await showRow(null);
    const words = 'To scale, on the smallest of its pipes';
    expect(screen.queryByText(words)).toBeNull();
    pick('Material', 'std/mf_pipe');
    await act(async () => pick('Thickness', 'in:2'));
    expect(screen.getByText(words)).toBeTruthy();
    expect(screen.getByText('51 mm mineral fibre pipe section')).toBeTruthy();
  });

  it('offers no bare surface as a finish', async () => {
    await showRow();
    expect(optionsOf('Finish')).toEqual(['PVC jacket']);
  });

  it('lets the thickness be chosen again when the material is another, and asks how a wrap is put up', async () => {
    const { writes, saved } = await showRow();
    pick('Material', 'std/mf_blanket_wrap');
    await save('Save the row');
    await waitFor(() => expect(screen.getByLabelText('Thickness').getAttribute('aria-invalid')).toBe('true'));
    expect(writes()).toHaveLength(0);
    pick('Thickness', 'in:1.5');
    fireEvent.change(screen.getByLabelText(/^As put up/), { target: { value: '1.125 in' } });
    await save('Save the row');
    await waitFor(() => expect(saved).toHaveBeenCalled());
    expect(writes()[0]!.body).toMatchObject({
      layers: [
        { materialId: 'std/mf_blanket_wrap', thickness: 'in:1.5', installed: { typed: { text: '1.125', unit: 'in' } } },
      ],
    });
  });

  it('begins with the next row number, and says what is missing at its field', async () => {
    const { writes } = await showRow(null);
    expect(screen.getByLabelText<HTMLInputElement>('Row').value).toBe('P02');
    await save('Save the row');
    await waitFor(() => expect(screen.getByLabelText('Service').getAttribute('aria-invalid')).toBe('true'));
    expect(screen.getByLabelText('Material').getAttribute('aria-invalid')).toBe('true');
    expect(screen.getByLabelText('Finish').getAttribute('aria-invalid')).toBe('true');
    expect(writes()).toHaveLength(0);
  });
});
