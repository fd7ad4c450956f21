import { dirname } from 'node:path';
import { createRequire } from 'node:module';
import express, { type Express } from 'express';
import type { Route } from '../http/route';
import { openApiDocument } from './openapi';

const page = `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>Kerbline API</title>
<link rel="stylesheet" href="/api/docs/swagger-ui.css">
</head>
<body>
<div id="api"></div>
<script src="/api/docs/swagger-ui-bundle.js"></script>
<script src="/api/docs/open.js"></script>
</body>
</html>
`;

/** In a file of its own, because the content security policy lets no script into the page. */
const script = `SwaggerUIBundle({ url: '/api/openapi.json', dom_id: '#api', deepLinking: true });\n`;

/** The API's description, for programs at /api/openapi.json and for people at /api/docs. */
export function serveApiPage(app: Express, routes: readonly Route[]): void {
  const document = openApiDocument(routes);
  const assets = dirname(createRequire(import.meta.url).resolve('swagger-ui-dist/package.json'));
  app.get('/api/openapi.json', (_request, response) => void response.json(document));
  app.get('/api/docs', (_request, response) => void response.type('html').send(page));
  app.get('/api/docs/open.js', (_request, response) => void response.type('js').send(script));
  app.use('/api/docs', express.static(assets, { index: false, cacheControl: false }));
}
