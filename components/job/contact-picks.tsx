import { useState } from 'react';
import type { UseFormReturn } from 'react-hook-form';

import type { JobInput } from '@/api/contracts/job';
import { ContactDialog } from '@/components/contact/contact-dialog';
import { inOrder } from '@/components/contact/contact-list';
import { useBound } from '@/components/forms/bound';
import { Button } from '@/components/ui/button';
import { Checkbox } from '@/components/ui/checkbox';
import { ProblemText } from '@/components/ui/field';
import { Grid, Row, Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';
import { useContacts } from '@/hooks/use-contacts';

import { contactText } from './job-facts';

/** Whom the job's revisions are sent to; somebody new is entered on the spot. */
export function ContactPicks({ control }: Pick<UseFormReturn<JobInput>, 'control'>) {
  const { contacts = [] } = useContacts();
  const { value: picked, change, leave, problem } = useBound({ control, name: 'contactIds' });
  const [isAdding, setAdding] = useState(false);
  const pick = (id: string, isPicked: boolean) =>
    change(isPicked ? [...picked, id] : picked.filter((other) => other !== id));
  return (
    <Stack gap="xxs" role="group" aria-label="Client">
      <Text weight="strong">Client</Text>
      <Text size="small" tone="inkSoft">
        Whom the revisions of this job are sent to.
      </Text>
      <Grid column={320} gap="xxs">
        {inOrder(contacts).map(({ id, name, company }) => (
          <Checkbox
            key={id}
            label={contactText({ name, company })}
            checked={picked.includes(id)}
            onChange={(isPicked) => pick(id, isPicked)}
            onBlur={leave}
          />
        ))}
      </Grid>
      {problem ? <ProblemText text={problem} /> : null}
      <Row>
        <Button label="New contact" onPress={() => setAdding(true)} />
      </Row>
      {isAdding ? (
        <ContactDialog
          onClose={() => setAdding(false)}
          onSaved={({ id }) => {
            pick(id, true);
            setAdding(false);
          }}
        />
      ) : null}
    </Stack>
  );
}
