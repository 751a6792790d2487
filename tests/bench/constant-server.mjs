// Bare Express that answers one constant text: what the portal's lists are measured against.
import { readFileSync } from 'node:fs';
import express from 'express';

const body = readFileSync(process.argv[2], 'utf8');
const app = express();
app.get('/constant', (_req, res) => res.type('json').send(body));
const server = app.listen(0, '127.0.0.1', () => console.log(server.address().port));
