import type { ReactNode } from 'react';

import { contactInputSchema, contactSchema, type Contact, type ContactInput } from '@/api/contracts/contact';
import { RowForm } from '@/components/forms/row-form';
import { useRowForm } from '@/components/forms/use-row-form';
import { useContactActions } from '@/hooks/use-contacts';

import { blankContact, ContactFields } from './contact-fields';

type ContactFormProps = {
  /** null: a new one */
  contact: Contact | null;
  onSaved: (contact: Contact) => void;
  onCancel?: () => void;
  actions?: ReactNode;
};

export function ContactForm({ contact, onSaved, onCancel, actions }: ContactFormProps) {
  const editing = useRowForm({
    schema: contactInputSchema,
    rowSchema: contactSchema,
    row: contact,
    initial: contact ?? blankContact,
    actions: useContactActions(),
    onSaved,
  });
  return (
    <RowForm
      editing={editing}
      label="Contact"
      saveLabel="Save the contact"
      factsOf={contactFacts}
      onCancel={onCancel}
      actions={actions}
    >
      <ContactFields control={editing.form.control} />
    </RowForm>
  );
}

export const contactFacts = ({ name, email, company, role }: ContactInput) => [
  { term: 'Name', value: name },
  { term: 'E-mail', value: email },
  { term: 'Company', value: company },
  { term: 'What they do', value: role },
];
