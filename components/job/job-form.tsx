import { jobInputSchema, jobSchema, type Job } from '@/api/contracts/job';
import type { LibraryCode } from '@/api/contracts/library';
import type { Session } from '@/api/contracts/session';
import { FormTextField } from '@/components/forms/form-text-field';
import { RowForm } from '@/components/forms/row-form';
import { useRowForm } from '@/components/forms/use-row-form';
import { Heading } from '@/components/ui/heading';
import { Grid } from '@/components/ui/stack';
import { useContacts } from '@/hooks/use-contacts';
import { useChangeJob } from '@/hooks/use-job';
import { useCreateJob } from '@/hooks/use-jobs';
import { useUnits } from '@/hooks/use-units';

import { BasisFields } from './basis-fields';
import { blankJob } from './blank-job';
import { ContactPicks } from './contact-picks';
import { DueFields } from './due-fields';
import { jobFacts } from './job-facts';

type JobFormProps = {
  /** null: a new one */
  job: Job | null;
  firm: Session['firm'];
  codes: readonly LibraryCode[];
  onSaved: (job: Job) => void;
  onCancel: () => void;
};

export function JobForm({ job, firm, codes, onSaved, onCancel }: JobFormProps) {
  const { units } = useUnits();
  const { contacts = [] } = useContacts();
  const editing = useRowForm({
    schema: jobInputSchema,
    rowSchema: jobSchema,
    row: job,
    initial: job ?? blankJob(firm, codes[0]?.id ?? ''),
    actions: { create: useCreateJob(), change: useChangeJob() },
    onSaved,
  });
  const { form } = editing;
  const { control } = form;
  return (
    <RowForm
      editing={editing}
      label="Job"
      saveLabel={job ? 'Save the job' : 'Open the job'}
      factsOf={(values) => jobFacts(values, { units, contacts, codes })}
      onCancel={onCancel}
    >
      <Grid column={240}>
        <FormTextField control={control} name="number" label="Number" hint="As it stands on the document" />
        <FormTextField control={control} name="name" label="Name" />
        <FormTextField control={control} name="site" label="Site" optional />
      </Grid>
      <FormTextField
        control={control}
        name="scope"
        label="Scope"
        hint="In words that a client understands; it opens the document."
        multiline={3}
        optional
      />
      <DueFields form={form} timeZone={firm.timeZone} />
      <ContactPicks control={control} />
      <BasisFields control={control} codes={codes} />
      <Heading>The specification it follows</Heading>
      <Grid column={180}>
        <FormTextField control={control} name="specification.number" label="Section" optional />
        <FormTextField control={control} name="specification.title" label="Title" optional />
        <FormTextField control={control} name="specification.revision" label="Revision" optional />
        <FormTextField control={control} name="specification.date" label="Date" kind="date" blank={null} optional />
      </Grid>
    </RowForm>
  );
}
