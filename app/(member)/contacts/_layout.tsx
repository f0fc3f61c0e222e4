import { Slot, useGlobalSearchParams } from 'expo-router';

import { contactItems } from '@/components/contact/contact-list';
import { useIsOpen } from '@/components/job/use-row-routes';
import { ListBeside } from '@/components/ui/list-beside';
import { ListPane } from '@/components/ui/list-pane';
import { useContacts } from '@/hooks/use-contacts';
import { useMay } from '@/hooks/use-session';

export default function ContactsLayout() {
  const { contact } = useGlobalSearchParams<{ contact?: string }>();
  const { contacts = [] } = useContacts();
  const mayEdit = useMay('edit-jobs');
  const list = (
    <ListPane
      title="Contacts"
      href="/contacts"
      items={contactItems(contacts)}
      chosen={contact}
      add={mayEdit ? { label: 'Add a contact', href: '/contacts/new' } : undefined}
    />
  );
  return (
    <ListBeside isOpen={useIsOpen('contacts')} list={list}>
      <Slot />
    </ListBeside>
  );
}
