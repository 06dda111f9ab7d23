import JSZip from 'jszip';
import type { LayerSetFile } from './layer-set.ts';

/** The earliest moment that a zip can hold. */
const EARLIEST = Date.UTC(1980, 0, 1);

/**
 * Files as a zip that is the same for the same files and date: each carries `date` (ISO date-time; a zip keeps it to
 * two seconds, in UTC here), no folder entries. Throws RangeError for what is not a date.
 */
export function packZip(files: readonly LayerSetFile[], date: string): Promise<Uint8Array> {
  const moment = Date.parse(date);
  if (Number.isNaN(moment)) throw new RangeError(`zip: got the date ${JSON.stringify(date)}, takes an ISO date-time`);
  const zip = new JSZip();
  for (const { name, bytes } of files) {
    zip.file(name, bytes, { date: new Date(Math.max(moment, EARLIEST)), createFolders: false, binary: true });
  }
  return zip.generateAsync({
    type: 'uint8array',
    compression: 'DEFLATE',
    compressionOptions: { level: 9 },
    platform: 'DOS',
  });
}
