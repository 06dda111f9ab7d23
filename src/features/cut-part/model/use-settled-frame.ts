import { useEffect, useState } from 'react';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';
import type { FrameFiles } from '../sweeping/workshop-client.ts';

/** While a person types, the frame changes with each key: it is looked at once it has stayed the same for this long. */
const SETTLE_MS = 250;

/** The frame and profile, as one object that changes only once they have settled. */
export function useSettledFrame(worked: DrawnFrame, profile: FileProfile): FrameFiles {
  const [settled, setSettled] = useState<FrameFiles>({ worked, profile });
  useEffect(() => {
    if (settled.worked === worked && settled.profile === profile) return;
    const timer = setTimeout(() => setSettled({ worked, profile }), SETTLE_MS);
    return () => clearTimeout(timer);
  }, [worked, profile, settled]);
  return settled;
}
