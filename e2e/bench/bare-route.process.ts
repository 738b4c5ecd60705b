import { readFileSync } from 'node:fs';
import express from 'express';

/** Express with one route that sends a file's bytes, and nothing else: what others are held to. */
const [port = '', file = ''] = process.argv.slice(2);

const body = readFileSync(file);
const app = express();
app.all('/', (_request, response) => {
  response.type('json').send(body);
});
app.listen(Number(port), '127.0.0.1');
