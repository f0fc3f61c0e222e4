import type { Contact } from '@/api/contracts/contact';
import { DeleteButton } from '@/components/job/delete-button';
import { useRowRoutes } from '@/components/job/use-row-routes';
import { FactList } from '@/components/ui/fact-list';
import { useContactActions } from '@/hooks/use-contacts';
import { useMay } from '@/hooks/use-session';

import { ContactForm, contactFacts } from './contact-form';

/** A contact to change, for who may; to read, for everyone else. */
export function ContactDetail({ contact }: { contact: Contact | null }) {
  const mayEdit = useMay('edit-jobs');
  const { remove } = useContactActions();
  const routes = useRowRoutes({ list: '/contacts', one: (id) => `/contacts/${id}` });
  if (contact && !mayEdit) return <FactList facts={contactFacts(contact).filter(({ value }) => value)} />;
  return (
    <ContactForm
      contact={contact}
      onSaved={({ id, name }) =>
        contact ? routes.changed(`${name} is saved.`) : routes.created(id, `${name} is added.`)
      }
      onCancel={contact ? undefined : routes.cancel}
      actions={
        contact ? (
          <DeleteButton
            noun="contact"
            name={contact.name}
            consequence="What was sent to this contact stays on record."
            onDelete={() => remove(contact)}
            onDeleted={routes.gone}
          />
        ) : undefined
      }
    />
  );
}
