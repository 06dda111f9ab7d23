import type { Comparison } from '#shared/kernel/compare/comparison.ts';
import { featureLines, sayLine, settingLine } from '#shared/kernel/compare/say-change.ts';
import { plural } from '../../ui/plural.ts';
import { Section } from '../../ui/section.tsx';

interface ChangeListProps {
  readonly comparison: Comparison;
  /** Place in `comparison.features`, -1 when none is picked. */
  readonly picked: number;
  readonly onPick: (at: number) => void;
}

/** What differs, part by part; pressing one lights up its place in the drawings, pressing it again puts the light out. */
export function ChangeList({ comparison, picked, onPick }: ChangeListProps) {
  const { features, settings, unit } = comparison;
  return (
    <>
      <Section heading="Parts that changed" aside={plural(features.length, 'part')}>
        {features.length === 0 ? (
          <p>No line of the frame moved.</p>
        ) : (
          <ul aria-label="Parts that changed">
            {features.map((change, i) => (
              <li
                key={`${change.kind} ${change.before?.id} ${change.after?.id}`}
                className="break-inside-avoid border-b border-rule"
              >
                <button
                  type="button"
                  aria-pressed={picked === i}
                  onClick={() => onPick(picked === i ? -1 : i)}
                  className="block min-h-8 w-full border-l-4 border-transparent py-1 pl-2 text-left hover:bg-board-light aria-pressed:border-caution aria-pressed:bg-board-light"
                >
                  <strong className="block">{change.label}</strong>
                  {featureLines(change, unit).map((line) => (
                    <span key={line.name} className="block">
                      {sayLine(line)}
                    </span>
                  ))}
                </button>
              </li>
            ))}
          </ul>
        )}
      </Section>
      <Section heading="Settings that changed" aside={plural(settings.length, 'setting')}>
        {settings.length === 0 ? (
          <p>Board, edge, cutters and turning over are as they were.</p>
        ) : (
          <ul aria-label="Settings that changed">
            {settings.map((change) => (
              <li key={`${change.subject} ${change.name}`} className="border-b border-rule py-1 pl-3 wrap-anywhere">
                <strong>{change.subject}:</strong> {sayLine(settingLine(change, unit))}
              </li>
            ))}
          </ul>
        )}
      </Section>
    </>
  );
}
