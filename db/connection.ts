import knex, { type Knex } from 'knex';
import { types } from 'pg';

// counts come as bigint; ours stay far below 2^53
types.setTypeParser(types.builtins.INT8, Number);
// a calendar date has no time zone: 2026-03-01 stays that text
types.setTypeParser(types.builtins.DATE, (text) => text);

export function connect(url: string, max = 10): Knex {
  return knex({ client: 'pg', connection: url, pool: { min: 0, max }, acquireConnectionTimeout: 10_000 });
}
