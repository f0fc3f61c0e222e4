import type { ReactNode } from 'react';
import type { FieldValues } from 'react-hook-form';

import { Button } from '@/components/ui/button';
import { FactList } from '@/components/ui/fact-list';
import { Notice } from '@/components/ui/notice';
import { Row } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';

import { Form } from './form';
import type { RowEditing } from './use-row-form';

type Said = { term: string; value: string };

type RowFormProps<Input extends FieldValues, Output extends Input> = {
  editing: RowEditing<Input, Output>;
  label: string;
  saveLabel: string;
  /** all that a row says, as a person reads it: to set two versions side by side */
  factsOf: (values: Output) => Said[];
  onCancel?: () => void;
  actions?: ReactNode;
  children: ReactNode;
};

export function RowForm<Input extends FieldValues, Output extends Input>(props: RowFormProps<Input, Output>) {
  const { editing, factsOf, children, ...form } = props;
  const { conflict, takeTheirs } = editing;
  return (
    <Form form={editing.form} onSave={editing.onSave} {...form}>
      {conflict ? (
        <ConflictNotice theirs={factsOf(conflict.theirs)} mine={factsOf(conflict.mine)} onTakeTheirs={takeTheirs} />
      ) : null}
      {children}
    </Form>
  );
}

type Difference = { term: string; theirs: string; mine: string };
type ConflictNoticeProps = { theirs: Said[]; mine: Said[]; onTakeTheirs: () => void };

/** Nothing is lost on either side: what only they changed is in the form already. */
function ConflictNotice({ theirs, mine, onTakeTheirs }: ConflictNoticeProps) {
  const rows = differences(theirs, mine);
  return (
    <Notice>
      <Text>
        {rows.length > 0
          ? 'What only they changed is taken over below. Here you differ; saving again puts yours in place of theirs.'
          : 'What they changed is taken over below, and you differ nowhere else. Save again to keep it so.'}
      </Text>
      <FactList
        facts={rows.map((row) => ({
          term: row.term,
          value: `Yours: ${row.mine || 'empty'}`,
          note: `Stored now: ${row.theirs || 'empty'}`,
        }))}
      />
      <Row>
        <Button label="Take theirs instead" onPress={onTakeTheirs} />
      </Row>
    </Notice>
  );
}

export function differences(theirs: readonly Said[], mine: readonly Said[]): Difference[] {
  const terms = [...new Set([...theirs, ...mine].map(({ term }) => term))];
  const valueIn = (said: readonly Said[], term: string) => said.find((one) => one.term === term)?.value ?? '';
  return terms
    .map((term) => ({ term, theirs: valueIn(theirs, term), mine: valueIn(mine, term) }))
    .filter((row) => row.theirs !== row.mine);
}
