import { act, fireEvent, render, screen, waitFor } from '@testing-library/react';
import { useForm } from 'react-hook-form';
import { z } from 'zod';

import { Form } from '@/components/forms/form';
import { FormCheckbox } from '@/components/forms/form-checkbox';
import { FormNumberField } from '@/components/forms/form-number-field';
import { FormSegmented } from '@/components/forms/form-segmented';
import { FormSelect } from '@/components/forms/form-select';
import { FormTextField } from '@/components/forms/form-text-field';
import { plainResolver } from '@/components/forms/plain-resolver';
import { showProblem } from '@/components/forms/show-problem';
import { RequestFailed } from '@/hooks/request';

const schema = z.object({
  name: z.string().min(1, 'Must be filled in'),
  note: z.string(),
  elbows: z.number().int('Must be a whole number').min(0, 'At least 0'),
  access: z.enum(['nobody', 'public']).nullable(),
  outdoors: z.boolean(),
  reach: z.enum(['low', 'high']),
});
type Input = z.input<typeof schema>;
const empty: Input = { name: '', note: '', elbows: 0, access: null, outdoors: false, reach: 'low' };

function PlaceForm({ save, start = empty }: { save: (input: Input) => Promise<unknown>; start?: Input }) {
  const form = useForm({ resolver: plainResolver(schema), defaultValues: start });
  const { control } = form;
  const segments = [
    { value: 'low', label: 'Low' },
    { value: 'high', label: 'High' },
  ];
  return (
    <>
      <a href="/jobs">All jobs</a>
      <Form form={form} label="Place" saveLabel="Save the place" onSave={save}>
        <FormTextField control={control} name="name" label="Name" />
        <FormTextField control={control} name="note" label="Note" multiline={3} />
        <FormNumberField control={control} name="elbows" label="Elbows" whole />
        <FormSelect
          control={control}
          name="access"
          label="Access"
          none="Not said"
          options={[{ value: 'public', label: 'The public' }]}
        />
        <FormCheckbox control={control} name="outdoors" label="Outdoors" />
        <FormSegmented control={control} name="reach" label="Reach" segments={segments} />
      </Form>
    </>
  );
}

const field = (label: string) => screen.getByLabelText<HTMLInputElement>(label);
const type = (label: string, value: string) => fireEvent.change(field(label), { target: { value } });
const save = () => fireEvent.click(screen.getByRole('button', { name: 'Save the place' }));
const failing = (fields?: Record<string, string>) => () =>
  Promise.reject(
    new RequestFailed({
      type: '/problems/invalid-input',
      title: 'Something is not filled in right',
      status: 400,
      fields,
    }),
  );

it('hands over what all its fields hold', async () => {
  const saved = jest.fn().mockResolvedValue(undefined);
  render(<PlaceForm save={saved} />);
  type('Name', 'Roof');
  type('Note', 'windy');
  type('Elbows', '12');
  type('Access', 'public');
  fireEvent.click(field('Outdoors'));
  fireEvent.click(screen.getByRole('radio', { name: 'High' }));
  save();
  await waitFor(() => expect(saved).toHaveBeenCalledTimes(1));
  expect(saved.mock.calls[0][0]).toEqual({
    name: 'Roof',
    note: 'windy',
    elbows: 12,
    access: 'public',
    outdoors: true,
    reach: 'high',
  });
});

it('saves nothing that is wrong, says so at the field and goes there', async () => {
  const saved = jest.fn();
  render(<PlaceForm save={saved} />);
  type('Elbows', '1.5');
  save();
  expect(await screen.findByText('Must be filled in')).toBeTruthy();
  expect(screen.getByText('Must be a whole number')).toBeTruthy();
  expect(document.activeElement).toBe(field('Name'));
  expect(field('Elbows').value).toBe('1.5');
  expect(saved).not.toHaveBeenCalled();
});

it('keeps what was typed when saving fails, and puts the server’s words beside their fields', async () => {
  render(<PlaceForm save={failing({ note: 'At most 2000 characters', 'air.hottest': 'Must be filled in' })} />);
  type('Name', 'Roof');
  save();
  expect(await screen.findByText('At most 2000 characters')).toBeTruthy();
  expect(document.activeElement).toBe(field('Note'));
  expect(screen.getByText(/^Something is not filled in right air.hottest: Must be filled in$/)).toBeTruthy();
  expect(field('Name').value).toBe('Roof');
});

it('lets what is no refusal through to where errors are shown', () => {
  const target = { setError: jest.fn(), getValues: jest.fn(() => empty) };
  expect(() => showProblem(new TypeError('a fault of ours'), target)).toThrow('a fault of ours');
});

it('saves by Ctrl+Enter out of a text of several lines', async () => {
  const saved = jest.fn().mockResolvedValue(undefined);
  render(<PlaceForm save={saved} start={{ ...empty, name: 'Roof' }} />);
  fireEvent.keyDown(field('Note'), { key: 'Enter' });
  fireEvent.keyDown(field('Note'), { key: 'Enter', ctrlKey: true });
  await waitFor(() => expect(saved).toHaveBeenCalledTimes(1));
});

describe('leaving', () => {
  const followed = jest.fn((event: Event) => {
    if (event.target instanceof HTMLAnchorElement) event.preventDefault();
  });
  beforeEach(() => {
    followed.mockClear();
    // what the page's own links would do, seen after the form had its say
    document.body.addEventListener('click', followed);
  });
  afterEach(() => document.body.removeEventListener('click', followed));
  const leave = () => fireEvent.click(screen.getByRole('link', { name: 'All jobs' }));
  const unload = () => {
    const event = new Event('beforeunload', { cancelable: true });
    window.dispatchEvent(event);
    return event.defaultPrevented;
  };

  it('asks before a link throws away what is not saved, and stays when told so', () => {
    render(<PlaceForm save={jest.fn()} />);
    type('Name', 'Roof');
    leave();
    expect(followed).not.toHaveBeenCalled();
    fireEvent.click(screen.getByRole('button', { name: 'Stay' }));
    expect(screen.queryByRole('alertdialog')).toBeNull();
    expect(field('Name').value).toBe('Roof');
    expect(unload()).toBe(true);
  });
  it('goes where the link led when told to', () => {
    render(<PlaceForm save={jest.fn()} />);
    type('Name', 'Roof');
    leave();
    followed.mockClear();
    fireEvent.click(screen.getByRole('button', { name: 'Leave without saving' }));
    expect(followed.mock.calls.some(([event]) => event.target === screen.getByRole('link', { name: 'All jobs' }))).toBe(
      true,
    );
  });
  it('asks nothing when nothing was changed, or all is saved', async () => {
    render(<PlaceForm save={jest.fn().mockResolvedValue(undefined)} />);
    leave();
    expect(followed.mock.calls.map(([event]) => event.target)).toEqual([
      screen.getByRole('link', { name: 'All jobs' }),
    ]);
    expect(unload()).toBe(false);
    type('Name', 'Roof');
    await act(async () => void save());
    await waitFor(() => expect(unload()).toBe(false));
    leave();
    expect(screen.queryByRole('alertdialog')).toBeNull();
    expect(followed.mock.lastCall?.[0].target).toBe(screen.getByRole('link', { name: 'All jobs' }));
  });
});
