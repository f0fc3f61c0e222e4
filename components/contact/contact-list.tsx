import type { Contact } from '@/api/contracts/contact';
import { useLayout } from '@/components/theme/use-layout';
import { DataTable, type Column } from '@/components/ui/data-table';
import { ListRows, type ListItem } from '@/components/ui/list-row';
import { Text } from '@/components/ui/text';

/** By company, then by name: how one looks for a person. */
export const inOrder = (contacts: readonly Contact[]): Contact[] =>
  [...contacts].sort((a, b) => a.company.localeCompare(b.company) || a.name.localeCompare(b.name));

export const contactItems = (contacts: readonly Contact[]): ListItem[] =>
  inOrder(contacts).map(({ id, name, company, role }) => ({
    key: id,
    title: name,
    text: [company, role].filter(Boolean).join(' · '),
    href: `/contacts/${id}`,
  }));

const columns: readonly Column<Contact>[] = [
  { key: 'name', label: 'Name', cell: ({ name }) => name },
  { key: 'company', label: 'Company', cell: ({ company }) => <Text>{company}</Text> },
  { key: 'role', label: 'What they do', cell: ({ role }) => <Text tone="inkSoft">{role}</Text> },
  { key: 'email', label: 'E-mail', cell: ({ email }) => <Text>{email}</Text> },
];

export function ContactList({ contacts }: { contacts: readonly Contact[] }) {
  const { isSplit } = useLayout();
  if (!isSplit) return <ListRows label="Contacts" items={contactItems(contacts)} flush />;
  return (
    <DataTable
      label="Contacts"
      columns={columns}
      rows={inOrder(contacts)}
      keyOf={({ id }) => id}
      hrefOf={({ id }) => `/contacts/${id}`}
    />
  );
}
