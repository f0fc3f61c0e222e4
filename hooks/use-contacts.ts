import { contactSchema, type Contact, type ContactInput } from '@/api/contracts/contact';
import { useRowActions, useRows } from '@/hooks/use-job-rows';

const contacts = { path: '/contacts', schema: contactSchema };

/** The firm's clients. */
export function useContacts() {
  const { rows, ...rest } = useRows(contacts);
  return { contacts: rows, ...rest };
}

export const useContactActions = () => useRowActions<ContactInput, Contact>(contacts, '/contacts');
