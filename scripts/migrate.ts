// Everything that the database's owner does, before server and worker start.
import { migrate } from '@/db/migrate';

async function main(): Promise<void> {
  const ownerUrl = process.env.OWNER_DATABASE_URL;
  if (!ownerUrl) throw new Error('OWNER_DATABASE_URL is not set');
  await migrate(ownerUrl);
}

main().catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
});
