import type { Finding } from '#shared/kernel/checks/finding.ts';
import { Notice } from '../../ui/notice.tsx';

/** What the checks say of the frame, cautions before notes. */
export function BoxFindings({ findings }: { readonly findings: readonly Finding[] }) {
  if (findings.length === 0) return <p>No findings: nothing stops this frame.</p>;
  return findings.map(({ level, text, remedy }, i) => (
    <Notice key={i} level={level}>
      {text} {remedy !== '' && <span className="text-pencil">{remedy}</span>}
    </Notice>
  ));
}
