import { useController, type UseFormReturn } from 'react-hook-form';

import type { Contact } from '@/api/contracts/contact';
import type { SendInput } from '@/api/contracts/sending';
import { fieldProblem } from '@/components/forms/field-problem';
import { Checkbox } from '@/components/ui/checkbox';
import { ProblemText } from '@/components/ui/field';
import { Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';

type RecipientsFieldProps = { form: UseFormReturn<SendInput>; contacts: readonly Contact[] };

/** The job's contacts; each gets a mail and a private link of their own. */
export function RecipientsField({ form, contacts }: RecipientsFieldProps) {
  const { field, fieldState } = useController({ control: form.control, name: 'contactIds' });
  const problem = fieldProblem(fieldState.error);
  const toggle = (id: string, chosen: boolean) =>
    field.onChange(chosen ? [...field.value, id] : field.value.filter((other) => other !== id));
  return (
    <Stack gap="xxs" role="group" aria-label="Recipients">
      <Text weight="strong">Recipients</Text>
      {contacts.map(({ id, name, company, email }) => (
        <Checkbox
          key={id}
          label={[name, company].filter(Boolean).join(', ')}
          hint={email}
          checked={field.value.includes(id)}
          onChange={(chosen) => toggle(id, chosen)}
        />
      ))}
      {contacts.length === 0 ? (
        <Text tone="inkSoft">The job names no contact yet. Add one in its overview.</Text>
      ) : null}
      {problem ? <ProblemText text={problem} /> : null}
    </Stack>
  );
}
