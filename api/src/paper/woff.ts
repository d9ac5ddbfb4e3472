import { inflateSync } from 'node:zlib';

const headerSize = 44;
const entrySize = 20;

/**
 * The font inside a WOFF 1.0 file, as a plain sfnt (TrueType), so that its tables are inflated once and not at each
 * use. Source: W3C Recommendation "WOFF File Format 1.0", sections 3 to 5.
 * @throws when the buffer is not WOFF 1.0
 */
export function unwrapWoff(woff: Buffer): Buffer {
  if (woff.toString('latin1', 0, 4) !== 'wOFF') throw new Error('This is not a WOFF 1.0 file.');
  const count = woff.readUInt16BE(12);
  const entries = Array.from({ length: count }, (_, index) => tableAt(woff, headerSize + index * entrySize));
  const directory = Buffer.alloc(12 + 16 * count);
  woff.copy(directory, 0, 4, 8);
  directory.writeUInt16BE(count, 4);
  const power = Math.floor(Math.log2(count));
  directory.writeUInt16BE(16 * 2 ** power, 6);
  directory.writeUInt16BE(power, 8);
  directory.writeUInt16BE(16 * count - 16 * 2 ** power, 10);
  let offset = directory.length;
  entries.forEach(({ tag, checksum, data, length }, index) => {
    const at = 12 + 16 * index;
    directory.write(tag, at, 'latin1');
    directory.writeUInt32BE(checksum, at + 4);
    directory.writeUInt32BE(offset, at + 8);
    directory.writeUInt32BE(length, at + 12);
    offset += data.length;
  });
  return Buffer.concat([directory, ...entries.map(({ data }) => data)]);
}

/** A table, inflated where it was deflated, and padded to four bytes. */
function tableAt(woff: Buffer, at: number) {
  const offset = woff.readUInt32BE(at + 4);
  const packed = woff.readUInt32BE(at + 8);
  const length = woff.readUInt32BE(at + 12);
  const bytes = woff.subarray(offset, offset + packed);
  const data = packed < length ? inflateSync(bytes) : bytes;
  const padding = Buffer.alloc((4 - (length % 4)) % 4);
  return {
    tag: woff.toString('latin1', at, at + 4),
    checksum: woff.readUInt32BE(at + 16),
    length,
    data: Buffer.concat([data, padding]),
  };
}
