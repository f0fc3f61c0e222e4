import type { FieldPath, UseFormReturn } from 'react-hook-form';

import type { RunDraft, RunInput } from '@/api/contracts/run';
import { FormNumberField } from '@/components/forms/form-number-field';
import { FormQuantityField } from '@/components/forms/form-quantity-field';
import { FormSelect } from '@/components/forms/form-select';
import { FormTextField } from '@/components/forms/form-text-field';

import { RunEndsField, RunOrientationField } from './run-choice-fields';
import { RunFittingsField } from './run-fittings-field';
import { RunHoldField } from './run-hold-field';
import { RunSizeField } from './run-size-field';
import { statusOptions, type RunEntry } from './run-fields';
import type { RunLookups } from './run-row';

export type RunFormFields = UseFormReturn<RunDraft, unknown, RunInput>;
type RunEntryFieldProps = { label: string; entry: RunEntry; form: RunFormFields; lookups: RunLookups };

/** One field of the form, by its description. */
export function RunEntryField({ label, entry: { control: entry }, form, lookups }: RunEntryFieldProps) {
  const { control } = form;
  switch (entry.kind) {
    case 'text':
      return (
        <FormTextField
          control={control}
          name={entry.name}
          label={label}
          optional={entry.optional}
          multiline={entry.multiline}
        />
      );
    case 'choice':
      return (
        <FormSelect
          control={control}
          name={entry.name}
          label={label}
          options={optionsOf(entry.name, lookups)}
          none={entry.optional ? 'None' : undefined}
        />
      );
    case 'quantity':
      return (
        <FormQuantityField
          control={control}
          name={pathOf(entry.name)}
          label={label}
          kind={entry.quantity}
          optional={entry.optional}
          blank={entry.optional ? null : undefined}
        />
      );
    case 'count':
      return <FormNumberField control={control} name={pathOf(entry.name)} label={label} whole />;
    case 'own':
      return <OwnField name={entry.name} form={form} lookups={lookups} />;
  }
}

type OwnName = Extract<RunEntry['control'], { kind: 'own' }>['name'];

function OwnField({ name, form, lookups }: { name: OwnName; form: RunFormFields; lookups: RunLookups }) {
  switch (name) {
    case 'size':
      return <RunSizeField form={form} lookups={lookups} />;
    case 'orientation':
      return <RunOrientationField form={form} />;
    case 'ends':
      return <RunEndsField form={form} />;
    case 'fittings':
      return <RunFittingsField form={form} />;
    case 'hold':
      return <RunHoldField form={form} />;
  }
}

const quantityPaths = [
  'shape.length',
  'shape.diameter',
  'shape.width',
  'shape.height',
  'shape.area',
  'shape.count',
  'elevation',
] as const;
/** The description names paths as text; only these are fields of the form. */
function pathOf(name: string): FieldPath<RunDraft> {
  const path = quantityPaths.find((known) => known === name);
  if (!path) throw new Error(`The form has no field ${name}`);
  return path;
}

type ChoiceName = Extract<RunEntry['control'], { kind: 'choice' }>['name'];

function optionsOf(name: ChoiceName, { services, places, levels, drawings }: RunLookups) {
  const named = (rows: readonly { id: string; name: string }[]) =>
    rows.map(({ id, name: label }) => ({ value: id, label }));
  switch (name) {
    case 'serviceId':
      return named(services);
    case 'placeId':
      return named(places);
    case 'levelId':
      return named(levels);
    case 'drawingId':
      return drawings.map(({ id, number, title }) => ({ value: id, label: `${number} ${title}`.trim() }));
    case 'status':
      return statusOptions;
  }
}
