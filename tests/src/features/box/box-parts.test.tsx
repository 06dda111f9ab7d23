import { fireEvent, screen, within } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { listBoxParts } from '#shared/kernel/box/list-box-parts.ts';
import { newFrame } from '#shared/kernel/particulars/new-frame.ts';
import { boxPartsCsv } from '../../../../src/features/box/box-parts-csv.ts';
import { BoxPartsDialog } from '../../../../src/features/box/box-parts-dialog.tsx';
import { show } from '../../show.tsx';

const FRAME = newFrame('in', 'B33 two-door base');
/** Types the whole text and leaves the field: what each keystroke does is the length field's own test. */
function enter(input: HTMLElement, value: string) {
  fireEvent.change(input, { target: { value } });
  fireEvent.blur(input);
}
const row = (name: RegExp) => within(screen.getByRole('row', { name }));

describe('BoxPartsDialog', () => {
  it('When the depth of the box is not given, then it says so, and with it the size has its growth', () => {
    show(<BoxPartsDialog particulars={FRAME} onClose={() => undefined} />);
    expect(row(/^Left end/).getByText('depth not given')).toBeTruthy();
    enter(screen.getByLabelText('Depth of the box'), '20');
    expect(row(/^Left end/).getByText('20 1/4')).toBeTruthy();
  });

  it('When dados run out through the edge, then the overhang there is asked for and taken off', () => {
    show(<BoxPartsDialog particulars={FRAME} onClose={() => undefined} />);
    expect(row(/^Left end/).getByText('30 1/2')).toBeTruthy();
    enter(screen.getByLabelText('Overhang at the bottom'), '1/2');
    expect(row(/^Left end/).getByText('30')).toBeTruthy();
    expect(screen.queryByLabelText('Overhang left')).toBeNull();
  });

  it('When a frame has no dados, then it says that nothing plugs in', () => {
    show(<BoxPartsDialog particulars={{ ...FRAME, dados: [] }} onClose={() => undefined} />);
    expect(screen.getByText('No part plugs into this frame: it has no dados.')).toBeTruthy();
  });

  it('When the list is saved, then the browser is offered a CSV file', async () => {
    const blobs: Blob[] = [];
    vi.spyOn(HTMLAnchorElement.prototype, 'click').mockImplementation(() => undefined);
    URL.createObjectURL = (blob) => `blob:${blobs.push(blob as Blob)}`;
    URL.revokeObjectURL = () => undefined;
    const { user } = show(<BoxPartsDialog particulars={FRAME} onClose={() => undefined} />);
    await user.click(screen.getByRole('button', { name: 'Save as CSV' }));
    expect(await blobs[0]?.text()).toBe(boxPartsCsv(listBoxParts(FRAME), 'in'));
    vi.restoreAllMocks();
  });
});

describe('boxPartsCsv', () => {
  it('When parts are written, then each is a line of RFC 4180 with decimals, and a formula in a name is made text', () => {
    const text = boxPartsCsv(
      [
        {
          part: '=Left, "A"',
          count: 2,
          thickness: 0.75,
          width: undefined,
          length: 30.5,
          growth: 0.25,
          grows: 'front edge',
          remark: '',
          runsOut: [],
        },
      ],
      'in',
    );
    // RFC 4180, section 2: lines end in CRLF, cells with commas or quotes stand in quotes, a quote is doubled.
    expect(text).toBe(
      'Part,Count,Unit,Thickness,Front to back with growth,Length,Grows by,Edge that grows\r\n' +
        '"\'=Left, ""A""",2,in,0.75,,30.5,0.25,front edge\r\n',
    );
  });
});
