import { inOrderOfDue } from '@/components/job/job-order';
import { jobsLead } from '@/components/job/jobs-lead';

const now = new Date('2026-12-01T12:00:00Z');
const job = (number: string, date: string | null) => ({
  id: number,
  number,
  name: number,
  site: '',
  bidDue: date ? { date, time: '14:00', zone: 'Europe/Dublin' } : null,
  runs: 0,
  onHold: 0,
  lastRevision: null,
});
const jobs = [
  job('none', null),
  job('long ago', '2026-10-01'),
  job('later', '2026-12-20'),
  job('yesterday', '2026-11-30'),
  job('next', '2026-12-03'),
];

it('puts what is due next first, and what is past last', () => {
  expect(inOrderOfDue(jobs, now).map(({ number }) => number)).toEqual([
    'next',
    'later',
    'none',
    'yesterday',
    'long ago',
  ]);
});

it('says which bid is next, and nothing where none is ahead', () => {
  expect(jobsLead(inOrderOfDue(jobs, now), now)).toBe('5 jobs. next is due next, in 2 days 2 hours.');
  expect(jobsLead([job('yesterday', '2026-11-30')], now)).toBe('1 job.');
});
