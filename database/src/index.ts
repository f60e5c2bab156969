export { createKnex, type ConnectionOptions } from './create-knex';
export { DEMO_PASSWORD, DEMO_PEOPLE, type DemoPerson } from './demo';
export { migrate, migrateDown } from './migrate';
export { seedDemo } from '../seeds/demo';
export { seedReference } from '../seeds/reference';
export { createTestDatabase, type TestDatabase } from './testing/test-database';
