import { migrate } from '#server/db/migrator.ts';

const ownerUrl = process.env.DATABASE_OWNER_URL;
if (!ownerUrl) {
  console.error('DATABASE_OWNER_URL is not set: it is the postgres:// address of plait_owner, who owns the tables.');
  process.exit(1);
}
const applied = await migrate(ownerUrl);
console.log(applied.length ? `Applied ${applied.join(', ')}.` : 'The tables are up to date.');
