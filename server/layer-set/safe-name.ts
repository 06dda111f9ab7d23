/** Longest part of a file name that a job or a frame gives. */
const LONGEST = 40;

// Devices that Windows sees in a name of whatever extension (Microsoft, "Naming Files, Paths, and Namespaces").
const DEVICES = /^(con|prn|aux|nul|com\d|lpt\d|conin|conout|clock)$/i;

// Letters that no decomposition turns into plain ones.
const PLAIN: Record<string, string> = {
  ß: 'ss',
  æ: 'ae',
  Æ: 'AE',
  ø: 'o',
  Ø: 'O',
  œ: 'oe',
  Œ: 'OE',
  đ: 'd',
  Đ: 'D',
  ł: 'l',
  Ł: 'L',
  þ: 'th',
  Þ: 'Th',
  ð: 'd',
  Ð: 'D',
  ı: 'i',
};

/**
 * A name as part of a file name that any system takes: ASCII letters, digits and hyphens, at most 40 characters,
 * never empty (`otherwise` stands in) and never a device of Windows.
 */
export function safeName(name: string, otherwise: string): string {
  const plain = name
    .replace(/[^\x00-\x7f]/g, (c) => PLAIN[c] ?? c)
    .normalize('NFKD')
    .replace(/\p{M}/gu, '');
  const safe = plain
    .replace(/[^A-Za-z0-9]+/g, '-')
    .replace(/^-/, '')
    .slice(0, LONGEST)
    .replace(/-$/, '');
  if (safe === '') return otherwise;
  return DEVICES.test(safe) ? `${otherwise}-${safe}` : safe;
}

/**
 * Safe names for several things side by side, no two the same on a system that does not tell capitals apart, and none
 * the same as `taken`: later ones get -2, -3 …
 */
export function safeNames(names: readonly string[], otherwise: string, taken: readonly string[] = []): string[] {
  const used = new Set(taken.map((name) => name.toLowerCase()));
  return names.map((name) => {
    const safe = safeName(name, otherwise);
    let unique = safe;
    for (let n = 2; used.has(unique.toLowerCase()); n++) unique = `${safe}-${n}`;
    used.add(unique.toLowerCase());
    return unique;
  });
}
