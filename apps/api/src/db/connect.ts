import { Sequelize } from 'sequelize';
import { initModels } from '../models/init-models.ts';

/** Opens the pool and binds the models to it. One database per process: the models are classes of the module. */
export function connect(databaseUrl: string, poolSize: number): Sequelize {
  const db = new Sequelize(databaseUrl, {
    dialect: 'postgres',
    logging: false,
    pool: { max: poolSize, min: 0, idle: 10_000, acquire: 20_000 },
    dialectOptions: { application_name: 'tipward', statement_timeout: 30_000 },
  });
  initModels(db);
  return db;
}
