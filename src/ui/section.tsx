import { useId, type ReactNode } from 'react';

interface SectionProps {
  readonly heading: string;
  /** At the far end of the heading's line, such as a unit or a count. */
  readonly aside?: ReactNode;
  /** 2 by default; 3 inside another section. */
  readonly level?: 2 | 3;
  readonly children: ReactNode;
}

/** A part of a sheet under a bold heading and a hairline. */
export function Section({ heading, aside, level = 2, children }: SectionProps) {
  const id = useId();
  const Heading = level === 2 ? 'h2' : 'h3';
  return (
    <section aria-labelledby={id} className="mb-5">
      <div className="mb-1.5 flex items-baseline justify-between gap-4 border-b border-rule pb-1">
        <Heading id={id} className="text-12 font-bold">
          {heading}
        </Heading>
        {aside !== undefined && <div className="text-12">{aside}</div>}
      </div>
      {children}
    </section>
  );
}
