import { existsSync } from 'node:fs';
import { join } from 'node:path';
import express, { type Express } from 'express';

const YEAR_MS = 365 * 24 * 3600_000;

const notBuilt = `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><title>Kerbline</title></head>
<body><h1>The client is not built</h1><p>The API answers, but there are no pages to show. <code>npm start</code> builds them.</p></body></html>
`;

/** The built client: named by their content, files may be kept for ever; the page that names them is asked for each time. */
export function serveClient(app: Express, clientDir: string | null): void {
  const page = clientDir && join(clientDir, 'index.html');
  if (!clientDir || !page || !existsSync(page)) {
    app.get('/{*path}', (_request, response) => {
      response.status(503).set('Cache-Control', 'no-store').type('html').send(notBuilt);
    });
    return;
  }
  const named = { immutable: true, maxAge: YEAR_MS, fallthrough: false, index: false as const };
  app.use('/_expo', express.static(join(clientDir, '_expo'), named));
  app.use('/assets', express.static(join(clientDir, 'assets'), named));
  app.use(express.static(clientDir, { index: false, setHeaders: (response) => response.setHeader('Cache-Control', 'no-cache') }));
  app.get('/{*path}', (_request, response) => {
    response.set('Cache-Control', 'no-cache').sendFile(page);
  });
}
