/** What a colour means on a sheet or screen; the values are the product's palette. */
export const SHEET_COLOURS = {
  paper: '#FAF7F0',
  ink: '#22282B',
  pencil: '#6A675E',
  board: '#EAD9BE',
  'board light': '#F3E8D5',
  back: '#9C3A22',
  'back light': '#E8C4B6',
  front: '#1D5C8F',
  bead: '#2E7D6B',
  lift: '#6B4A9E',
  stop: '#B3261E',
  caution: '#8A5A00',
  white: '#FFFFFF',
} as const;

export type SheetColour = keyof typeof SHEET_COLOURS;
