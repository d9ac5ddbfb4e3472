// Loaded into the api's process before it: tells at PROBE_PORT how long its event loop made everybody wait.
// GET /reset begins anew; GET / answers the 99th percentile in milliseconds.
import { createServer } from 'node:http';
import { monitorEventLoopDelay } from 'node:perf_hooks';
import { isMainThread } from 'node:worker_threads';

if (isMainThread) {
  const delay = monitorEventLoopDelay({ resolution: 1 });
  delay.enable();
  const server = createServer((request, response) => {
    if (request.url === '/reset') delay.reset();
    response.end(JSON.stringify({ p99: delay.percentile(99) / 1e6 }));
  });
  server.listen(Number(process.env['PROBE_PORT']), '127.0.0.1');
  // Alone it keeps no process alive.
  server.unref();
}
