import { useState, type ReactNode } from 'react';
import { useWatch } from 'react-hook-form';
import { StyleSheet, View } from 'react-native';

import { runInputSchema, runSchema, type Run, type RunDraft, type RunInput, type ShapeKind } from '@/api/contracts/run';
import { shapeWords } from '@/api/contracts/run-words';
import { RowForm } from '@/components/forms/row-form';
import { useRowForm } from '@/components/forms/use-row-form';
import { space } from '@/components/theme/tokens';
import { Heading } from '@/components/ui/heading';
import { Select } from '@/components/ui/select';

import { useRunActions } from '@/hooks/use-runs';
import { useUnits } from '@/hooks/use-units';

import { asShape, type RunValues } from './run-defaults';
import { runFacts } from './run-facts';
import { RunEntryField } from './run-entry-field';
import { runFields, type RunEntry, type RunField } from './run-fields';
import type { RunLookups } from './run-row';

type RunFormProps = {
  jobId: string;
  /** null: a new one */
  run: Run | null;
  initial: RunValues;
  lookups: RunLookups;
  onSaved: (run: Run) => void;
  onCancel: () => void;
  actions?: ReactNode;
};

type EntryField = RunField & { entry: RunEntry };
const entryFields = runFields.filter((field): field is EntryField => field.entry !== undefined);

const parts = [
  { part: 'what', title: 'What it is' },
  { part: 'size', title: 'Size and length' },
  { part: 'where', title: 'Where it runs' },
  { part: 'state', title: 'State' },
] as const;
const shapeOptions = Object.entries(shapeWords).map(([value, label]) => ({ value, label }));
const isShape = (value: string): value is ShapeKind => value in shapeWords;

/** Everything that is measured of one run, by the description that the table's columns come from. */
export function RunForm({ jobId, run, initial, lookups, onSaved, onCancel, actions }: RunFormProps) {
  const { units } = useUnits();
  const { create, change } = useRunActions(jobId);
  const [newId] = useState(() => crypto.randomUUID());
  const editing = useRowForm<RunDraft, RunInput, Run>({
    schema: runInputSchema,
    rowSchema: runSchema,
    row: run,
    initial,
    actions: { create: (input) => create(input, newId), change },
    onSaved,
  });
  const { form } = editing;
  const kind = useWatch({ control: form.control, name: 'shape.kind' });
  const changeShape = (value: string) => {
    if (!isShape(value)) return;
    const values = form.getValues();
    const fittings = value === 'pipe' || kind === 'pipe' ? {} : values.fittings;
    form.reset({ ...values, shape: asShape(value, values.shape), fittings }, { keepDefaultValues: true });
  };
  return (
    <RowForm
      editing={editing}
      label={run ? `Run ${run.number}` : 'New run'}
      saveLabel="Save the run"
      factsOf={(values) => runFacts(values, lookups, units)}
      onCancel={onCancel}
      actions={actions}
    >
      <Select label="Kind" value={kind} options={shapeOptions} onChange={changeShape} />
      {parts.map(({ part, title }) => (
        <View key={part} role="group" aria-label={title} style={styles.part}>
          <Heading level={2} size="body">
            {title}
          </Heading>
          <View style={styles.fields}>
            {fieldsOf(part, kind).map((field) => (
              <View key={field.key} style={isBroad(field) ? styles.broad : styles.field}>
                <RunEntryField label={field.label} entry={field.entry} form={form} lookups={lookups} />
              </View>
            ))}
          </View>
        </View>
      ))}
    </RowForm>
  );
}

const fieldsOf = (part: RunEntry['part'], kind: ShapeKind) =>
  entryFields.filter(({ entry }) => entry.part === part && (!entry.shapes || entry.shapes.includes(kind)));

const broad = new Set(['size', 'fittings', 'hold', 'note', 'serviceId', 'placeId']);
const isBroad = ({ entry: { control } }: EntryField) => broad.has(control.name);

const styles = StyleSheet.create({
  part: { gap: space.sm, paddingTop: space.xs },
  fields: { flexDirection: 'row', flexWrap: 'wrap', gap: space.sm },
  field: { flexGrow: 1, flexShrink: 1, flexBasis: 150, minWidth: 0 },
  broad: { flexBasis: '100%', minWidth: 0 },
});
