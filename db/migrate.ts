import { connect } from '@/db/connection';
import { installQueues } from '@/db/queues';
import config from '@/knexfile';

/** Everything the owner does: tables, policies, doors, queues. */
export async function migrate(ownerUrl: string): Promise<void> {
  const owner = connect(ownerUrl, 2);
  try {
    await owner.migrate.latest(config.migrations).catch((error: unknown) => {
      throw isNewer(error) ? new Error(newer) : error;
    });
    await installQueues(ownerUrl, owner);
  } finally {
    await owner.destroy();
  }
}

const newer =
  'This database was migrated by a newer Thickset: update this checkout, or empty the database with npm run reset.';

/** Knex finds rows of migrations whose files this checkout does not have. */
const isNewer = (error: unknown) => error instanceof Error && error.message.includes('migration directory is corrupt');
