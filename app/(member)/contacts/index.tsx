import { ContactList } from '@/components/contact/contact-list';
import { EmptyState } from '@/components/ui/empty-state';
import { LoadingScreen } from '@/components/ui/loading-screen';
import { ProblemScreen } from '@/components/ui/problem-screen';
import { Screen } from '@/components/ui/screen';
import { useContacts } from '@/hooks/use-contacts';
import { useMay } from '@/hooks/use-session';

export default function ContactsScreen() {
  const { contacts, problem, reload } = useContacts();
  const mayEdit = useMay('edit-jobs');
  const add = mayEdit ? ({ label: 'Add a contact', href: '/contacts/new' } as const) : undefined;
  if (problem && !contacts) return <ProblemScreen problem={problem} onRetry={reload} />;
  if (!contacts) return <LoadingScreen title="Contacts" shape="table" />;
  const isEmpty = contacts.length === 0;
  return (
    <Screen
      title="Contacts"
      lead="Your clients’ people: whom a revision is sent to."
      action={isEmpty ? undefined : add}
    >
      {isEmpty ? (
        <EmptyState title="No contact yet" action={add}>
          Enter the people whom you send quantities to. A job then names them.
        </EmptyState>
      ) : (
        <ContactList contacts={contacts} />
      )}
    </Screen>
  );
}
