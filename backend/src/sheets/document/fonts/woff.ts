import { inflateSync } from 'node:zlib';

const WOFF_SIGNATURE = 0x774f4646;
const WOFF_HEADER_BYTES = 44;
const WOFF_ENTRY_BYTES = 20;
const SFNT_HEADER_BYTES = 12;
const SFNT_ENTRY_BYTES = 16;

const padded = (length: number): number => (length + 3) & ~3;

/** Unpacks a WOFF 1 file to the TrueType font inside, once, so that no table is inflated again while drawing. */
export function unpackWoff(woff: Buffer): Buffer {
  if (woff.length < WOFF_HEADER_BYTES || woff.readUInt32BE(0) !== WOFF_SIGNATURE) throw new Error('Not a WOFF 1 font');
  const count = woff.readUInt16BE(12);
  const tables = Array.from({ length: count }, (_, i) => {
    const entry = WOFF_HEADER_BYTES + i * WOFF_ENTRY_BYTES;
    const offset = woff.readUInt32BE(entry + 4);
    const packed = woff.subarray(offset, offset + woff.readUInt32BE(entry + 8));
    const length = woff.readUInt32BE(entry + 12);
    return {
      tag: woff.readUInt32BE(entry),
      checksum: woff.readUInt32BE(entry + 16),
      data: packed.length < length ? inflateSync(packed) : packed,
    };
  });
  const sizes = tables.map((table) => padded(table.data.length));
  const sfnt = Buffer.alloc(SFNT_HEADER_BYTES + count * SFNT_ENTRY_BYTES + sizes.reduce((sum, size) => sum + size, 0));
  const steps = Math.floor(Math.log2(count));
  sfnt.writeUInt32BE(woff.readUInt32BE(4), 0);
  sfnt.writeUInt16BE(count, 4);
  sfnt.writeUInt16BE(16 * 2 ** steps, 6);
  sfnt.writeUInt16BE(steps, 8);
  sfnt.writeUInt16BE(16 * (count - 2 ** steps), 10);
  let offset = SFNT_HEADER_BYTES + count * SFNT_ENTRY_BYTES;
  tables.forEach(({ tag, checksum, data }, i) => {
    const entry = SFNT_HEADER_BYTES + i * SFNT_ENTRY_BYTES;
    sfnt.writeUInt32BE(tag, entry);
    sfnt.writeUInt32BE(checksum, entry + 4);
    sfnt.writeUInt32BE(offset, entry + 8);
    sfnt.writeUInt32BE(data.length, entry + 12);
    data.copy(sfnt, offset);
    offset += sizes[i] ?? 0;
  });
  return sfnt;
}
