import 'reflect-metadata';
import { DataSource } from 'typeorm';
import { entities } from './entities';
import { migrations } from './migrations/index';
import { ReadableNamingStrategy } from './naming-strategy';

/** The application's connection to PostgreSQL. Tables come from migrations only. */
export function createDataSource(url: string): DataSource {
  return new DataSource({
    type: 'postgres',
    url,
    entities,
    migrations,
    synchronize: false,
    namingStrategy: new ReadableNamingStrategy(),
    poolSize: 10,
    applicationName: 'leeward',
    logging: false,
  });
}
