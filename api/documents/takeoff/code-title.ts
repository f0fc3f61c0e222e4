import type { Snapshot } from '@/api/contracts/revision';

/** The job's code edition by its name, as the standards used have it. */
export const codeTitle = ({ standards, job }: Pick<Snapshot, 'standards' | 'job'>): string =>
  standards.find(({ kind, id }) => kind === 'code' && id.startsWith(`${job.codeEdition}/`))?.name ?? job.codeEdition;
