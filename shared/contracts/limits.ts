/** Limits shared by forms and routes. */
export const LIMITS = {
  nameLength: 120,
  labelLength: 40,
  noteLength: 500,
  passwordShortest: 10,
  passwordLongest: 200,
  emailLength: 254,
  openings: 100,
  dados: 100,
  tracedVertices: 20_000,
  /** Bytes of one uploaded frame file. */
  frameFileBytes: 2 * 1024 * 1024,
  frameFilesAtOnce: 50,
  jsonBodyBytes: 2 * 1024 * 1024,
} as const;
