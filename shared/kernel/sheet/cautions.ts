/** What the product always carries: on every setup sheet and on the page that offers the download. */
export const CAUTIONS = [
  'Dry-run above the board first.',
  "Check cutter data against the cutter maker's drawing and the cutter in your hand.",
  'Measure the board.',
  'Offcuts come free when openings and perimeter are cut through: hold them down.',
  'MDF dust harms lungs: extract it and wear a respirator.',
  "Machine guarding, dust and formaldehyde rules are your local authority's; the machine maker's manual and a qualified operator come first.",
] as const;
