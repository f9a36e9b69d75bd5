import { DefaultNamingStrategy, type NamingStrategyInterface, type Table } from 'typeorm';

const snake = (name: string) => name.replace(/([a-z0-9])([A-Z])/g, '$1_$2').toLowerCase();
const nameOf = (table: Table | string) =>
  (typeof table === 'string' ? table : table.name).split('.').pop() ?? '';

/** Snake case in the database, and names for constraints that a person can read in an error. */
export class ReadableNamingStrategy extends DefaultNamingStrategy implements NamingStrategyInterface {
  override tableName(className: string, given: string | undefined) {
    return given ?? snake(className);
  }
  override columnName(property: string, given: string | undefined, prefixes: string[]) {
    return [...prefixes.map(snake), given ?? snake(property)].join('_');
  }
  override primaryKeyName(table: Table | string) {
    return `pk_${nameOf(table)}`;
  }
  override foreignKeyName(table: Table | string, columns: string[]) {
    return `fk_${nameOf(table)}_${columns.join('_')}`;
  }
  override uniqueConstraintName(table: Table | string, columns: string[]) {
    return `uq_${nameOf(table)}_${columns.join('_')}`;
  }
  override indexName(table: Table | string, columns: string[]) {
    return `ix_${nameOf(table)}_${columns.join('_')}`;
  }
}
