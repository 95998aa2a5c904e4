import { createApp } from './app.js';
import { readEnv } from './config/env.js';
import { migrate } from './database/migrate.js';

const env = readEnv(process.env);
await migrate(env.DATABASE_URL);
const app = await createApp(env);
await app.listen(env.PORT, env.HOST);
process.send?.({ ready: await app.getUrl() });
