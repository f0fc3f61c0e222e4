import type { Knex } from 'knex';
import type PgBoss from 'pg-boss';

import { systemClock, type Clock } from '@/api/adapters/clock';
import type { Config } from '@/api/config';
import { createServices, type Services } from '@/api/services/services';
import { createDoors } from '@/db/repositories/doors';
import { createWithFirm } from '@/db/with-firm';

type Parts = { db: Knex; boss: PgBoss; config: Pick<Config, 'bcryptCost' | 'publicUrl'> };

/** The services on a database and a queue: the one way in which server, worker, seed and tests get them. */
export function wireServices({ db, boss, config, clock = systemClock }: Parts & { clock?: Clock }): Services {
  const { bcryptCost, publicUrl } = config;
  const settings = { bcryptCost, publicUrl };
  return createServices({ withFirm: createWithFirm({ db, boss }), doors: createDoors(db), clock, settings });
}

/** Gives services that share one transaction, each at the moment of its own clock: all that they do stands or falls together. */
export function wireTogether({ db, boss, config }: Parts) {
  const { bcryptCost, publicUrl } = config;
  const settings = { bcryptCost, publicUrl };
  const doors = createDoors(db);
  const withFirm = createWithFirm({ db, boss });
  return (firmId: string, work: (servicesAt: (clock: Clock) => Services) => Promise<void>): Promise<void> =>
    withFirm(firmId, (behind) =>
      work((clock) => createServices({ withFirm: (_firmId, inner) => inner(behind), doors, clock, settings })),
    );
}
