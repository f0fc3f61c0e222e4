import type { Logger } from 'pino';

const patience = 8000;

/** Ends in order at a signal, or when whoever started us is gone; what takes too long is cut off. */
export function onStop(logger: Logger, close: () => Promise<void>): void {
  let stopping = false;
  const stop = () => {
    if (stopping) return;
    stopping = true;
    setTimeout(() => process.exit(1), patience).unref();
    close().then(
      () => process.exit(0),
      (error: unknown) => {
        logger.error(error, 'while stopping');
        process.exit(1);
      },
    );
  };
  for (const signal of ['SIGTERM', 'SIGINT', 'disconnect']) process.on(signal, stop);
}
