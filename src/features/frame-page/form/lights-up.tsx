import type { ReactNode } from 'react';
import type { FeatureId } from '#shared/kernel/frame/members.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';
import { light, useDesk } from '../model/desk.ts';

interface LightsUpProps {
  /** Asked only when it is pointed at or typed in. */
  readonly of: (worked: DrawnFrame) => readonly FeatureId[];
  readonly className?: string;
  readonly children: ReactNode;
}

/** Part of the form that lights up its feature on both faces while it is pointed at or typed in. */
export function LightsUp({ of, className, children }: LightsUpProps) {
  const { lit, editor } = useDesk();
  const on = () => light(lit, of(editor.store.get().drawn));
  const off = () => light(lit, []);
  return (
    <div className={className} onPointerEnter={on} onPointerLeave={off} onFocus={on} onBlur={off}>
      {children}
    </div>
  );
}
