import { ContactDetail } from '@/components/contact/contact-detail';
import { NewRowScreen } from '@/components/job/row-screen';

export default function NewContactScreen() {
  return (
    <NewRowScreen title="New contact" back={{ href: '/contacts', label: 'Contacts' }}>
      <ContactDetail contact={null} />
    </NewRowScreen>
  );
}
