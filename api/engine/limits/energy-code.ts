import { findCodeEdition } from '../standards/energy-codes';
import { judgeDuctCode } from './code-duct';
import { judgePipeCode } from './code-pipe';
import type { LimitVerdict } from './study-types';
import type { Trial } from './trial';
import { cannotTell, doesNotApply, worst } from './verdict';

/**
 * Energy code by the edition entered: its pipe table for pipes, its duct table for ducts; equipment is not covered.
 * A met limit meets the table entered, no more is claimed.
 *
 * @source the edition's tables; exemptions as entered, each with its reason
 */
export function judgeEnergyCode(trial: Trial): LimitVerdict {
  const { body, codeEdition, codeExempt, states } = trial.input;
  if (codeExempt !== null) return doesNotApply('energy-code', [codeExempt]);
  const edition = findCodeEdition(codeEdition);
  if (!edition) return cannotTell('energy-code', ['no table is entered for the job’s code edition']);
  if (body.shape === 'round-duct' || body.shape === 'rectangular-duct') return judgeDuctCode(trial, edition);
  if (body.shape !== 'pipe') return doesNotApply('energy-code', ['the table entered covers piping']);
  const [first, ...others] = states.map((state) => judgePipeCode(trial, edition, { pipe: body, state }));
  if (!first) return cannotTell('energy-code', ['the service has no temperatures']);
  return worst([first, ...others]);
}
