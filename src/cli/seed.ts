import { databaseFile, openDatabase } from '$lib/server/db/client';
import { migrateDatabase } from '$lib/server/db/migrate';
import { readEnv } from '$lib/server/env';
import { seedSamples } from '$lib/server/services/seed-samples';

/** `npm run seed`: makes the database ready and puts the samples in, without starting a server. */
const db = openDatabase(databaseFile(readEnv().SEVERALTY_DATA));
migrateDatabase(db);
const samples = seedSamples(db);
db.$client.close();
console.log(`${samples} samples are in the database.`);
