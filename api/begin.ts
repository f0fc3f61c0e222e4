import { readConfig, type Config } from '@/api/config';

/** Reads the configuration and starts; what is wrong is said in a sentence, not in a stack. */
export function begin(main: (config: Config) => Promise<void>): void {
  Promise.resolve()
    .then(() => main(readConfig(process.env)))
    .catch(giveUp);
}

export function giveUp(error: unknown): never {
  console.error(error instanceof Error ? error.message : error);
  process.exit(1);
}
