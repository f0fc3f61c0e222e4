import { fireEvent, render, screen, waitFor } from '@testing-library/react';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { z } from 'zod';

import { quantitySchema, type UnitSystem } from '@/api/contracts/quantities';
import { FieldUnitsProvider } from '@/components/forms/field-units';
import { Form } from '@/components/forms/form';
import { FormQuantityField } from '@/components/forms/form-quantity-field';
import { plainResolver } from '@/components/forms/plain-resolver';
import { Button } from '@/components/ui/button';

const schema = z.object({
  length: quantitySchema('length', { above: 0 }),
  height: quantitySchema('elevation').nullable(),
});
type Input = z.input<typeof schema>;

function RunForm({ save, start }: { save: (input: Input) => void; start: Input }) {
  const [units, setUnits] = useState<UnitSystem>('SI');
  const form = useForm({ resolver: plainResolver(schema), defaultValues: start });
  return (
    <FieldUnitsProvider units={units}>
      <Button label="Switch" onPress={() => setUnits(units === 'SI' ? 'IP' : 'SI')} />
      <Form form={form} label="Run" saveLabel="Save" onSave={async (input) => save(input)}>
        <FormQuantityField control={form.control} name="length" kind="length" label="Length" />
        <FormQuantityField control={form.control} name="height" kind="elevation" label="Height" />
      </Form>
    </FieldUnitsProvider>
  );
}

const start = (length: Input['length'] = { value: 86 }) => {
  const save = jest.fn();
  render(<RunForm save={save} start={{ length, height: null }} />);
  return save;
};
const length = () => screen.getByLabelText<HTMLInputElement>('Length');
const type = (text: string) => {
  fireEvent.change(length(), { target: { value: text } });
  fireEvent.blur(length());
};
const press = (name: string) => fireEvent.click(screen.getByRole('button', { name }));

it('keeps what was typed, and its value in metres', async () => {
  const save = start();
  type('45,5');
  press('Save');
  await waitFor(() => expect(save).toHaveBeenCalled());
  expect(save.mock.calls[0]).toEqual([{ length: { value: 45.5, typed: { text: '45,5', unit: 'm' } }, height: null }]);
});

it('reads another unit than the one in use, shows the value in its own and says what was typed', async () => {
  const save = start();
  type('150 ft');
  // 150 ft × 0.3048 m/ft (exact by the international foot of 1959)
  expect(length().value).toBe('45.72');
  expect(screen.getByText('Typed as 150 ft')).toBeTruthy();
  press('Save');
  await waitFor(() => expect(save).toHaveBeenCalled());
  expect(save.mock.calls[0][0].length).toEqual({ value: 150 * 0.3048, typed: { text: '150', unit: 'ft' } });
});

it('never changes the value by switching units', async () => {
  const save = start({ value: 45.72, typed: { text: '150', unit: 'ft' } });
  for (let turn = 0; turn < 10; turn += 1) press('Switch');
  expect(length().value).toBe('45.72');
  press('Switch');
  expect(length().value).toBe('150');
  press('Save');
  await waitFor(() => expect(save).toHaveBeenCalled());
  expect(save.mock.calls[0][0].length).toEqual({ value: 45.72, typed: { text: '150', unit: 'ft' } });
});

it.each([
  ['forty', 'Must be a number'],
  ['4 furlongs', 'Unit not known here: furlongs. Use m or ft'],
  ['0', 'Must be more than 0.0 m (0.0 ft)'],
  ['', 'Must be filled in'],
])('saves nothing for "%s", says why at the field, and keeps it', async (text, problem) => {
  const save = start();
  type(text);
  press('Save');
  expect(await screen.findByText(problem)).toBeTruthy();
  expect(length().value).toBe(text);
  expect(save).not.toHaveBeenCalled();
});

it('takes an empty field for not known where that is allowed', async () => {
  const save = start();
  fireEvent.change(screen.getByLabelText('Height'), { target: { value: '2.5' } });
  fireEvent.change(screen.getByLabelText('Height'), { target: { value: '' } });
  press('Save');
  await waitFor(() => expect(save).toHaveBeenCalled());
  expect(save.mock.calls[0][0].height).toBeNull();
});
