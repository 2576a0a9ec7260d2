import type { Model } from 'sequelize';
import { DataType } from 'sequelize-typescript';
import type { ModelAttributeColumnOptions } from 'sequelize';

/*
 * SQLite's STRICT tables know neither booleans nor JSON, and Sequelize goes by the declared type of a
 * column: these two translate.
 */

/** A boolean kept as 0 or 1. */
export function booleanColumn(name: string): Partial<ModelAttributeColumnOptions> {
  return {
    type: DataType.INTEGER,
    get(this: Model): boolean {
      return Boolean(this.getDataValue(name));
    },
    set(this: Model, value: boolean): void {
      this.setDataValue(name, value ? 1 : 0);
    },
  };
}

/** A value kept as JSON text. */
export function jsonColumn(name: string): Partial<ModelAttributeColumnOptions> {
  return {
    type: DataType.TEXT,
    get(this: Model): unknown {
      return JSON.parse(this.getDataValue(name) as string) as unknown;
    },
    set(this: Model, value: unknown): void {
      this.setDataValue(name, JSON.stringify(value));
    },
  };
}
