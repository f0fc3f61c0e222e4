import type { Knex } from 'knex';

import type { Contact, ContactInput } from '@/api/contracts/contact';
import type { RowSeen } from './job-rows';

type ContactRow = { id: string; version: number; name: string; company: string; email: string; role: string };

export function createContactRepository(transaction: Knex.Transaction, firmId: string) {
  const contacts = () => transaction('contacts').where({ firm_id: firmId });
  return {
    async list(): Promise<Contact[]> {
      const rows: ContactRow[] = await contacts().orderBy(['name', 'entered']);
      return rows.map(toContact);
    },
    async ofJob(jobId: string): Promise<Contact[]> {
      const rows: ContactRow[] = await transaction('contacts as c')
        .join('job_contacts as j', { 'j.firm_id': 'c.firm_id', 'j.contact_id': 'c.id' })
        .where({ 'c.firm_id': firmId, 'j.job_id': jobId })
        .orderBy('j.position')
        .select('c.*');
      return rows.map(toContact);
    },
    /** Holds the contact for this transaction, so that its version stays what it is. */
    async hold(id: string): Promise<Contact | undefined> {
      const row: ContactRow | undefined = await contacts().where({ id }).forUpdate().first();
      return row && toContact(row);
    },
    /** Which of these ids this firm knows. */
    async known(ids: readonly string[]): Promise<Set<string>> {
      const rows: { id: string }[] = await contacts().whereIn('id', ids).select('id');
      return new Set(rows.map(({ id }) => id));
    },
    async insert({ name, company, email, role }: ContactInput): Promise<Contact> {
      const row = { firm_id: firmId, name, company, email, role };
      const rows: ContactRow[] = await transaction('contacts').insert(row).returning('*');
      return toContact(rows[0]!);
    },
    /** Gives undefined when the row is not at the version that was seen. */
    async update({ id, version }: RowSeen, { name, company, email, role }: ContactInput): Promise<Contact | undefined> {
      const change = { name, company, email, role, version: version + 1, updated_at: transaction.fn.now() };
      const rows: ContactRow[] = await contacts().where({ id, version }).update(change).returning('*');
      return rows[0] && toContact(rows[0]);
    },
    remove: async ({ id, version }: RowSeen): Promise<boolean> =>
      (await contacts().where({ id, version }).delete()) === 1,
    /** Numbers of the jobs that name this contact. */
    async jobsNaming(id: string): Promise<string[]> {
      const rows: { number: string }[] = await transaction('job_contacts as c')
        .join('jobs as j', { 'j.firm_id': 'c.firm_id', 'j.id': 'c.job_id' })
        .where({ 'c.firm_id': firmId, 'c.contact_id': id })
        .orderBy('j.number')
        .select('j.number');
      return rows.map(({ number }) => number);
    },
  };
}
export type ContactRepository = ReturnType<typeof createContactRepository>;

const toContact = ({ id, version, name, company, email, role }: ContactRow): Contact => ({
  id,
  version,
  name,
  company,
  email,
  role,
});
