import { AppError, wrongField } from '../errors.ts';
import type { TaskAnswer, TaskKind } from './tasks.ts';

/** An error of a worker, which cannot cross the thread as itself, as one that the server answers with. */
export function toMakingError(kind: TaskKind, answer: Extract<TaskAnswer, { ok: false }>): Error {
  if (answer.name === 'ProofFailed') {
    const failed =
      answer.proof?.checks.filter((c) => !c.ok).map((c) => `${c.name}: got ${c.got}, wanted ${c.wanted}`) ?? [];
    return new AppError('proof-failed', `${kind}: ${answer.message} ${failed.join('; ')}`, {
      details: { proof: answer.proof },
    });
  }
  // Two line sets of this frame would land on one layer: the profile's template does not tell them apart.
  if (answer.name === 'LayerClash')
    return wrongField('profile', answer.message, 'a profile that gives each line set of this frame a layer of its own');
  if (answer.name === 'NotTraceable' && answer.code !== undefined)
    return new AppError('drawing-refused', `${kind}: ${answer.code}`, {
      message: answer.message,
      details: { reason: answer.code },
    });
  const error = new Error(`${kind}: ${answer.message}`);
  error.stack = answer.stack;
  return error;
}
