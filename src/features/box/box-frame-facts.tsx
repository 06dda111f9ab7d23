import type { WorkedFrame } from '#shared/kernel/worked-frame.ts';
import { formatLength, formatWithUnit } from '#shared/kernel/units/format-length.ts';

/** The frame that follows from a box, in words: its size, its members, its openings. */
export function BoxFrameFacts({ worked: { particulars, contours } }: { readonly worked: WorkedFrame }) {
  const { outline, unit } = particulars;
  const say = (value: number): string => formatLength(value, unit);
  const facts: [string, string][] = [
    ['Frame', `${say(contours.width)} × ${formatWithUnit(contours.height, unit)}`],
    ...(outline.kind === 'members'
      ? ([
          ['Stiles', `${say(outline.stiles.left)} left, ${say(outline.stiles.right)} right`],
          ['Rails', `${say(outline.rails.top)} top, ${say(outline.rails.bottom)} bottom`],
          ...('columns' in outline.layout ? [['Mid-stiles', say(outline.layout.between)]] : []),
        ] as [string, string][])
      : []),
    ['Openings', contours.openings.map(({ width, height }) => `${say(width)} × ${say(height)}`).join(', ')],
  ];
  return (
    <dl className="mb-3 grid grid-cols-[auto_minmax(0,1fr)] gap-x-6 text-12">
      {facts.map(([label, text]) => (
        <div key={label} className="contents">
          <dt className="text-pencil">{label}</dt>
          <dd className="wrap-anywhere">{text}</dd>
        </div>
      ))}
    </dl>
  );
}
