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
  /** Of a drawing from elsewhere (DXF Reference: names up to 255 characters). */
  layerName: 255,
  layersLeftOut: 1_000,
  tracedLoops: 20_000,
  tracedFrames: 100,
  /** Bytes of one uploaded drawing. */
  drawingBytes: 32 * 1024 * 1024,
  /** Bytes of one uploaded frame file. */
  frameFileBytes: 2 * 1024 * 1024,
  frameFilesAtOnce: 50,
  jsonBodyBytes: 2 * 1024 * 1024,
} as const;
