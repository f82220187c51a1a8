import { Sequelize } from 'sequelize';
import { expect, it } from 'vitest';
import { createTestDatabase } from '../../test/test-database.ts';
import { createMigrator } from './migrator.ts';
import { migrations } from './migrations/index.ts';

const SHAPE = `
  SELECT 'column ' || table_name || '.' || column_name || ' ' || data_type || ' ' || is_nullable AS item
    FROM information_schema.columns WHERE table_schema = 'public'
  UNION ALL SELECT 'trigger ' || event_object_table || '.' || trigger_name || ' ' || event_manipulation
    FROM information_schema.triggers WHERE trigger_schema = 'public'
  UNION ALL SELECT 'grant ' || table_name || ' ' || privilege_type
    FROM information_schema.table_privileges WHERE grantee = 'tipward_app'
  UNION ALL SELECT 'function ' || proname FROM pg_proc WHERE pronamespace = 'public'::regnamespace
  ORDER BY 1`;

async function shapeOf(db: Sequelize): Promise<string[]> {
  const [rows] = await db.query(SHAPE);
  return (rows as { item: string }[]).map(({ item }) => item);
}

it('goes up, all the way down, and up again to the same schema', async () => {
  const database = await createTestDatabase('empty');
  const db = new Sequelize(database.ownerUrl, { logging: false });
  try {
    const migrator = createMigrator(db, () => undefined);
    expect((await migrator.up()).map(({ name }) => name)).toEqual(migrations.map(({ name }) => name));
    const first = await shapeOf(db);
    expect(first.length).toBeGreaterThan(150);
    await migrator.down({ to: 0 });
    expect(await shapeOf(db)).toEqual(['column schema_migrations.name character varying NO']);
    await migrator.up();
    expect(await shapeOf(db)).toEqual(first);
  } finally {
    await db.close();
    await database.drop();
  }
});

it('refuses to run as the application', async () => {
  const database = await createTestDatabase('empty');
  const db = new Sequelize(database.appUrl, { logging: false });
  try {
    await expect(createMigrator(db, () => undefined).up()).rejects.toThrow(/permission denied/u);
  } finally {
    await db.close();
    await database.drop();
  }
});
