import { problems, type Problem, type ProblemType } from '@/api/contracts/problem';

type Extra = Pick<Problem, 'fields' | 'current' | 'retryAfter' | 'reference'>;

/** An expected failure; services throw it. `problems` lists every type with its status and title. */
export class AppError extends Error {
  constructor(
    readonly type: ProblemType,
    readonly detail?: string,
    readonly extra: Extra = {},
  ) {
    super(detail ?? problems[type].title);
    this.name = 'AppError';
  }

  toProblem(): Problem {
    return { type: `/problems/${this.type}`, ...problems[this.type], detail: this.detail, ...this.extra };
  }
}
