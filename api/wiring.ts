import type { Knex } from 'knex';
import type PgBoss from 'pg-boss';

import { systemClock, type Clock } from '@/api/adapters/clock';
import type { Config } from '@/api/config';
import { createServices, type Services } from '@/api/services/services';
import { createDoors } from '@/db/repositories/doors';
import { createWithFirm } from '@/db/with-firm';

type Parts = { db: Knex; boss: PgBoss; config: Pick<Config, 'bcryptCost' | 'publicUrl'>; clock?: Clock };

/** The services on a database and a queue: the one way in which server, worker, seed and tests get them. */
export function wireServices({ db, boss, config, clock = systemClock }: Parts): Services {
  const { bcryptCost, publicUrl } = config;
  return createServices({
    withFirm: createWithFirm({ db, boss }),
    doors: createDoors(db),
    clock,
    settings: { bcryptCost, publicUrl },
  });
}
