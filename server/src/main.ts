import { DataSource } from 'typeorm';
import { refuseOpenDemo } from '../seeds/demo/refuse-open-demo.js';
import { DemoSeeder } from '../seeds/demo/seed-demo.js';
import { seedLibrary } from '../seeds/seed-library.js';
import { createApp } from './app.js';
import { FirstAdministratorService } from './auth/first-administrator.service.js';
import { readEnv } from './config/env.js';
import { migrate } from './database/migrate.js';

const env = readEnv(process.env);
await migrate(env.DATABASE_URL);
const app = await createApp(env);
await app.init();
await seedLibrary(app.get(DataSource));
if (env.DIFFOLIO_DEMO) await new DemoSeeder(app).seed();
await refuseOpenDemo(app.get(DataSource), env.HOST);
await app.listen(env.PORT, env.HOST);

const link = await app.get(FirstAdministratorService).link();
if (link) process.stderr.write(`Nobody has an account yet. The first administrator signs up here, once:\n${link}\n`);
process.send?.({ ready: await app.getUrl() });
