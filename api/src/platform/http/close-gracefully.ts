import type { Server } from 'node:http';
import type { Logger } from 'pino';

/** How long requests that are under way may take to end. */
const patienceMs = 8_000;

/**
 * On SIGTERM or SIGINT: takes no more connections, lets requests under way end, closes the rest, and ends
 * the process. `endStreams` ends what would stay open for ever; `close` comes after the last request.
 */
export function closeGracefully(
  server: Server,
  log: Logger,
  { endStreams, close }: { endStreams: () => Promise<void>; close: () => Promise<void> },
): void {
  let closing = false;
  const shut = (signal: string): void => {
    if (closing) return;
    closing = true;
    log.info({ signal }, 'Closing.');
    const giveUp = setTimeout(() => {
      server.closeAllConnections();
    }, patienceMs);
    server.close(() => {
      clearTimeout(giveUp);
      void close().then(
        () => process.exit(0),
        () => process.exit(1),
      );
    });
    void endStreams();
    server.closeIdleConnections();
  };
  process.once('SIGTERM', shut);
  process.once('SIGINT', shut);
}
