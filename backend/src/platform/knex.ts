import type { Knex } from 'knex';

/** Token of the connection to PostgreSQL. Repositories take it; a service hands a transaction down in its place. */
export const KNEX = Symbol('knex');

/** Types of knex that decorated signatures name. */
export type Database = Knex;

const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/i;

/** An id from an address that is no UUID names nothing; PostgreSQL would call it an error. */
export const isUuid = (text: string) => UUID.test(text);
