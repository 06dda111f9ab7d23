import { useState } from 'react';
import type { FrameRow } from '#shared/contracts/jobs.ts';
import type { StoredProfile } from '#shared/contracts/profiles.ts';
import { Cautions } from '../../ui/cautions.tsx';
import { DownloadButton } from '../../ui/download-button.tsx';
import { plural } from '../../ui/plural.ts';
import { Select } from '../../ui/select.tsx';

interface JobDownloadProps {
  readonly jobId: string;
  readonly frames: readonly FrameRow[];
  readonly profiles: readonly StoredProfile[];
  readonly defaultProfileId: string;
}

/** One zip with the newest revision of each frame that has one, in a file profile. Says what is not in it. */
export function JobDownload({ jobId, frames, profiles, defaultProfileId }: JobDownloadProps) {
  const [chosen, setChosen] = useState(defaultProfileId);
  const profileId = profiles.some(({ id }) => id === chosen) ? chosen : (profiles[0]?.id ?? '');
  const released = frames.filter((frame) => frame.revision !== '');
  const behind = released.filter((frame) => frame.draftChanged);
  const left = frames.length - released.length;
  return (
    <div className="flex flex-col gap-3">
      <p>
        {released.length === 0
          ? 'No frame has a released revision yet. Open a frame and release one; then all of them come in one zip.'
          : `Newest revision of ${plural(released.length, 'frame')}, a folder each, with a cover sheet.`}
      </p>
      {released.length > 0 && left > 0 && (
        <p className="text-12">Not in it, because never released: {plural(left, 'frame')}.</p>
      )}
      {behind.length > 0 && (
        <p className="text-12">
          Draft changes since the release are not in it: {behind.map((frame) => frame.name).join(', ')}.
        </p>
      )}
      <Select
        label="File profile"
        layout="stack"
        options={profiles.map(({ id, profile }) => ({ value: id, label: profile.name }))}
        value={profileId}
        onValue={setChosen}
      />
      <DownloadButton
        path={`/api/jobs/${encodeURIComponent(jobId)}/layer-sets.zip?profile=${encodeURIComponent(profileId)}`}
        disabled={released.length === 0}
      >
        Download all layer sets
      </DownloadButton>
      <Cautions />
    </div>
  );
}
