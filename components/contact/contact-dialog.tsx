import { useForm } from 'react-hook-form';

import { contactInputSchema, type Contact, type ContactInput } from '@/api/contracts/contact';
import { FormDialog } from '@/components/forms/form-dialog';
import { plainResolver } from '@/components/forms/plain-resolver';
import { useContactActions } from '@/hooks/use-contacts';

import { blankContact, ContactFields } from './contact-fields';

type ContactDialogProps = { onSaved: (contact: Contact) => void; onClose: () => void };

/** A new contact without leaving what is being filled in. */
export function ContactDialog({ onSaved, onClose }: ContactDialogProps) {
  const { create } = useContactActions();
  const form = useForm<ContactInput>({ resolver: plainResolver(contactInputSchema), defaultValues: blankContact });
  return (
    <FormDialog
      title="New contact"
      saveLabel="Save the contact"
      form={form}
      onSave={(input) => create(input).then(onSaved)}
      onClose={onClose}
    >
      <ContactFields control={form.control} />
    </FormDialog>
  );
}
