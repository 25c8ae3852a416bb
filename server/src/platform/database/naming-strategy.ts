import { DefaultNamingStrategy, type Table } from 'typeorm'

const snake = (text: string): string => text.replace(/[A-Z]/g, (letter) => `_${letter.toLowerCase()}`)

/** Every constraint has a name a person can read, the same in the entities and in the migrations. */
export class NamingStrategy extends DefaultNamingStrategy {
  override columnName(propertyName: string, customName: string): string {
    return customName || snake(propertyName)
  }

  override primaryKeyName(table: Table | string): string {
    return `pk_${this.getTableName(table)}`
  }

  override foreignKeyName(table: Table | string, columnNames: string[]): string {
    return this.named('fk', table, columnNames)
  }

  override uniqueConstraintName(table: Table | string, columnNames: string[]): string {
    return this.named('uq', table, columnNames)
  }

  override indexName(table: Table | string, columnNames: string[]): string {
    return this.named('ix', table, columnNames)
  }

  private named(prefix: string, table: Table | string, columnNames: string[]): string {
    const own = columnNames.filter((name) => name !== 'district_id').join('_')
    return `${prefix}_${this.getTableName(table)}_${own}`.replace(/_$/, '')
  }
}
