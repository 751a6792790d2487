/** The one place outside `db/` takes tables and operators from, so that nobody else knows the query builder's package. */
export { and, asc, desc, eq, gt, gte, inArray, isNotNull, isNull, like, lt, lte, max, ne, or, sql, type SQL } from 'drizzle-orm';
export * from './schema';
export { allowed } from './allowed';
export { contains } from './contains';
export { fillFleetRows, writeFleetRows, writeRiskLimit, type FleetPart } from './fleet-rows';
export { migrateDatabase, openDatabase, type Connection, type Database } from './open';
export { producerDb, type ProducerDb } from './producer-db';
export { systemDb, type Person, type Producer, type SystemDb } from './system-db';
