import { useLocalSearchParams } from 'expo-router';

import { ContactDetail } from '@/components/contact/contact-detail';
import { RowScreen } from '@/components/job/row-screen';
import { useContacts } from '@/hooks/use-contacts';

export default function ContactScreen() {
  const { contact: id } = useLocalSearchParams<'/contacts/[contact]'>();
  const { contacts, problem, reload } = useContacts();
  return (
    <RowScreen
      noun="contact"
      id={id}
      rows={contacts}
      problem={problem}
      onRetry={reload}
      titleOf={({ name }) => name}
      back={{ href: '/contacts', label: 'Contacts' }}
    >
      {(contact) => <ContactDetail key={id} contact={contact} />}
    </RowScreen>
  );
}
