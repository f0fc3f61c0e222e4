import type { Knex } from 'knex';

import type { Firm } from '@/api/contracts/session';

type FirmRow = {
  id: string;
  name: string;
  town: string;
  address: string;
  email: string;
  phone: string;
  currency: string;
  locale: string;
  paper: Firm['paper'];
  time_zone: string;
  units: Firm['units'];
  quote_prefix: string;
  quote_valid_days: number;
  record_address: string;
};

/** The firm itself: who it is on paper, and its habits. */
export function createFirmRepository(transaction: Knex.Transaction, firmId: string) {
  return {
    async get(): Promise<Firm> {
      const row = await transaction<FirmRow>('firms').where({ id: firmId }).first();
      if (!row) throw new Error('The transaction has no firm');
      return toFirm(row);
    },
  };
}
export type FirmRepository = ReturnType<typeof createFirmRepository>;

const toFirm = ({ time_zone, quote_prefix, quote_valid_days, record_address, ...row }: FirmRow): Firm => ({
  id: row.id,
  name: row.name,
  town: row.town,
  address: row.address,
  email: row.email,
  phone: row.phone,
  currency: row.currency,
  locale: row.locale,
  paper: row.paper,
  timeZone: time_zone,
  units: row.units,
  quotePrefix: quote_prefix,
  quoteValidDays: quote_valid_days,
  recordAddress: record_address,
});
