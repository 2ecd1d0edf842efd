import express from 'express';
import { createServer } from 'vite';
import { createApp } from './app.ts';
import { readConfig } from './config.ts';
import { openDatabase } from './db.ts';

/**
 * For work only. Vite answers for the app; its page runs inline scripts, so the
 * security headers of the built app are left to the hub's own answers.
 */
const config = readConfig(process.env);
const database = openDatabase(config.dataFolder);
const hub = createApp({ database });
const vite = await createServer({ server: { middlewareMode: true } });

const app = express();
app.use('/api', (request, response, next) => {
  request.url = request.originalUrl;
  hub(request, response, next);
});
app.use(vite.middlewares);
app.listen(config.port, config.host, () => {
  console.log(`Steelyard for development: http://localhost:${config.port}`);
});

for (const signal of ['SIGTERM', 'SIGINT'] as const) {
  process.once(signal, () => {
    database.close();
    process.exit(0);
  });
}
