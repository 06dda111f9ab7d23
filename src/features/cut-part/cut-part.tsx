import { useEffect, useId, useMemo, useState } from 'react';
import type { Point } from '#shared/kernel/contour/contour.ts';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import { formatLength } from '#shared/kernel/units/format-length.ts';
import type { WorkedFrame } from '#shared/kernel/worked-frame.ts';
import { Button } from '../../ui/button.tsx';
import { Checkbox } from '../../ui/checkbox.tsx';
import { Choice } from '../../ui/choice.tsx';
import { Notice } from '../../ui/notice.tsx';
import { ProgressText } from '../../ui/progress-text.tsx';
import { Section } from '../../ui/section.tsx';
import { Select } from '../../ui/select.tsx';
import { DifferenceReport } from './difference-report.tsx';
import { describePart, stepSentence } from './model/describe-part.ts';
import { facePalette, readTokens, stepColours } from './model/palette.ts';
import { listPlaces, regionAbout, WHOLE, type Place } from './model/places.ts';
import { listSteps } from './model/steps.ts';
import { firstHold } from './model/turning.ts';
import { useSettledFrame } from './model/use-settled-frame.ts';
import { PlaneControls } from './plane-controls.tsx';
import { hasWebgl } from './scene/has-webgl.ts';
import { PartStage } from './scene/part-stage.tsx';
import { ReliefStage } from './scene/relief-stage.tsx';
import { StepList } from './step-list.tsx';
import type { Plane } from './work/picture.ts';
import { useAnswer } from './work/use-answer.ts';
import { WorkshopClient } from './work/workshop-client.ts';

interface CutPartProps {
  readonly worked: WorkedFrame;
  /** The files looked at are those of this profile; the product's own when it is left out. */
  readonly profile?: FileProfile;
}
