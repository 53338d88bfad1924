import { createHash } from 'node:crypto';
import { createReadStream } from 'node:fs';
import { DomainError } from '../../shared/errors/domain-error.js';
import type { Encoding } from '../../shared/csv/csv-format.js';

/** What one pass over a file tells of it. */
export interface FileFacts {
  sha256: string;
  size: number;
  encoding: Encoding;
  byteOrderMark: boolean;
  /** Its first bytes. */
  head: Buffer;
}

const HEAD_BYTES = 256 * 1024;
const MARKS: readonly [Encoding, number[]][] = [
  ['utf-8', [0xef, 0xbb, 0xbf]],
  ['utf-16le', [0xff, 0xfe]],
  ['utf-16be', [0xfe, 0xff]],
];
const NO_TEXT: readonly [string, number[]][] = [
  ['a ZIP archive or a workbook', [0x50, 0x4b, 0x03, 0x04]],
  ['an old workbook', [0xd0, 0xcf, 0x11, 0xe0]],
  ['a PDF document', [0x25, 0x50, 0x44, 0x46]],
  ['a compressed file', [0x1f, 0x8b]],
];
/** Of every second byte, how many must be 0 to tell UTF-16 without a mark. */
const ZERO_SHARE = 0.4;

/** Reads a file once: its hash, its size, its encoding; a file that is no text is refused. */
export async function inspectFile(path: string): Promise<FileFacts> {
  const hash = createHash('sha256');
  const utf8 = new TextDecoder('utf-8', { fatal: true });
  const head: Buffer[] = [];
  let size = 0;
  let isUtf8 = true;
  for await (const piece of createReadStream(path) as AsyncIterable<Buffer>) {
    hash.update(piece);
    if (size < HEAD_BYTES) head.push(piece);
    isUtf8 = isUtf8 && decodes(utf8, piece);
    size += piece.length;
  }
  const start = Buffer.concat(head).subarray(0, HEAD_BYTES);
  refuseNoText(start);
  const marked = MARKS.find(([, mark]) => startsWith(start, mark));
  return {
    sha256: hash.digest('hex'),
    size,
    encoding: marked?.[0] ?? unmarkedEncoding(start, isUtf8),
    byteOrderMark: marked !== undefined,
    head: start,
  };
}

function decodes(decoder: InstanceType<typeof TextDecoder>, piece: Buffer): boolean {
  try {
    decoder.decode(piece, { stream: true });
    return true;
  } catch {
    return false;
  }
}

function refuseNoText(head: Buffer): void {
  if (head.length === 0) throw new DomainError('import.unreadable', 'The file is empty.');
  const found = NO_TEXT.find(([, magic]) => startsWith(head, magic));
  if (found === undefined) return;
  throw new DomainError('import.unreadable', `The file is ${found[0]}, not a text: save the list as CSV.`);
}

function startsWith(head: Buffer, bytes: readonly number[]): boolean {
  return bytes.every((byte, index) => head[index] === byte);
}

function unmarkedEncoding(head: Buffer, isUtf8: boolean): Encoding {
  const [even, odd] = [zeroShare(head, 0), zeroShare(head, 1)];
  if (odd > ZERO_SHARE && even < odd / 4) return 'utf-16le';
  if (even > ZERO_SHARE && odd < even / 4) return 'utf-16be';
  return isUtf8 ? 'utf-8' : 'windows-1252';
}

function zeroShare(head: Buffer, from: number): number {
  let zeros = 0;
  for (let index = from; index < head.length; index += 2) if (head[index] === 0) zeros += 1;
  return zeros / Math.max(1, head.length / 2);
}
