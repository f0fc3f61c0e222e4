import { readFileSync } from 'node:fs';

import { EngineError } from '@/api/engine/engine-error';
import { answerBatch } from '@/api/engine/heat/batch';

/** `npm run --silent solve < cases.json > results.json`: a JSON array of cases in, an array of results out. */
function main(): number {
  const { answers, failed } = answerBatch(parsed(readFileSync(0, 'utf8')));
  process.stdout.write(`[${answers.map((answer) => JSON.stringify(answer)).join(',\n')}]\n`);
  return failed > 0 ? 1 : 0;
}

function parsed(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    throw new EngineError('The input is no JSON: it must be an array of cases');
  }
}

try {
  process.exitCode = main();
} catch (error) {
  if (!(error instanceof EngineError)) throw error;
  process.stderr.write(`${error.message}\n`);
  process.exitCode = 1;
}
