import pg from 'pg';
import { expect, it } from 'vitest';
import { useDatabase } from '#tests/support/database.ts';

const database = useDatabase();

it('gives every test file a database of its own, in which the application owns nothing', async () => {
  const app = new pg.Client({ connectionString: database.appUrl });
  await app.connect();
  const { rows } = await app.query(
    'SELECT rolsuper OR rolbypassrls AS mighty, (SELECT count(*)::int FROM pg_class WHERE relowner = r.oid) AS owned FROM pg_roles r WHERE rolname = current_user',
  );
  await app.end();
  expect(rows).toEqual([{ mighty: false, owned: 0 }]);
});
