// npm start: builds what is missing, then becomes the server, in this very process so that signals reach it.
import { join } from 'node:path';
import { buildAll } from './build.mjs';

const { client, server } = await buildAll();
process.env.CLIENT_DIR = client;
await import(join(server, 'server.mjs'));
