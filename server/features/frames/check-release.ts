import type { ReleaseRefused } from '#shared/contracts/frames.ts';
import type { Finding } from '#shared/kernel/checks/finding.ts';
import { AppError } from '../../errors.ts';

const details = (findings: readonly Finding[]): ReleaseRefused => ({
  findings: findings.map(({ code, text, remedy }) => ({ code, text, remedy })),
});

/** Whether findings let a frame be released: throws 'frame-has-stops', or 'cautions-not-acknowledged' with those that are left. */
export function checkRelease(findings: readonly Finding[], acknowledged: readonly string[]): void {
  const stops = findings.filter((f) => f.level === 'stop');
  if (stops.length > 0)
    throw new AppError('frame-has-stops', `release with stops: ${stops.map((f) => f.code).join(', ')}`, {
      details: details(stops),
    });
  const left = findings.filter((f) => f.level === 'caution' && !acknowledged.includes(f.code));
  if (left.length > 0) {
    throw new AppError('cautions-not-acknowledged', `release with cautions: ${left.map((f) => f.code).join(', ')}`, {
      details: details(left),
    });
  }
}
