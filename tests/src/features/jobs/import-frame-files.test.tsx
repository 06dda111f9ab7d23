import { fireEvent, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { LIMITS } from '#shared/contracts/limits.ts';
import { ImportFrameFiles } from '../../../../src/features/jobs/import-frame-files.tsx';
import { answerCalls, json } from '../../answer-calls.ts';
import { show } from '../../show.tsx';

const file = (name: string) => new File(['{}'], name, { type: 'application/json' });

describe('ImportFrameFiles', () => {
  it('When files are chosen, then each is listed as taken or with what is wrong in it', async () => {
    const seen = answerCalls(() =>
      json({
        taken: [{ file: 'good.frame.json', frameId: 'f1', name: 'B33 two-door base' }],
        refused: [
          {
            file: 'bad.frame.json',
            message: 'not a valid frame file: 1 entry to mend',
            fields: [
              {
                path: 'thickness',
                message: 'thickness: got -1, takes a length above 0',
                got: '-1',
                takes: 'a length above 0',
              },
            ],
          },
        ],
      }),
    );
    const { user } = show(<ImportFrameFiles jobId="j1" />);
    await user.upload(screen.getByLabelText('Frame files'), [file('good.frame.json'), file('bad.frame.json')]);
    expect((await screen.findByRole('link', { name: 'B33 two-door base' })).getAttribute('href')).toBe('/frames/f1');
    expect(screen.getByText('thickness: got -1, takes a length above 0')).toBeTruthy();
    expect((seen[0]?.body as FormData).getAll('files').map((part) => (part as File).name)).toEqual([
      'good.frame.json',
      'bad.frame.json',
    ]);
  });

  it('When more files are dropped than are taken at once, then it says how many and sends none', () => {
    const seen = answerCalls(() => undefined);
    show(<ImportFrameFiles jobId="j1" />);
    const files = Array.from({ length: LIMITS.frameFilesAtOnce + 1 }, (_, i) => file(`${i}.frame.json`));
    fireEvent.drop(screen.getByText(/Drop frame files here/), { dataTransfer: { files } });
    expect(screen.getByRole('alert').textContent).toContain(
      `Got ${files.length} files; takes up to ${LIMITS.frameFilesAtOnce} at once.`,
    );
    expect(seen).toEqual([]);
  });
});
