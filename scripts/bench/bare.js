// The measure of everything else: an Express that does nothing but answer a small JSON. PORT says where.
import { createRequire } from 'node:module';
import { root } from '../lib/places.js';

const express = createRequire(`${root}/api/package.json`)('express');
const app = express();
app.get('/', (_request, response) => {
  response.json({ words: 'parallel spanners', count: 2, right: true });
});
app.listen(Number(process.env['PORT']), '127.0.0.1');
