/** Text of a file and how its bytes were read. */
export interface DecodedText {
  readonly text: string;
  readonly encoding: 'UTF-8' | 'UTF-16' | 'Windows-1252';
  /** Whether a byte-order mark stood at the start; it is taken off. */
  readonly mark: boolean;
}

export type DecodeResult =
  | { readonly state: 'text'; readonly decoded: DecodedText }
  | { readonly state: 'refused'; readonly what: string };

const SIGNATURES: readonly (readonly [readonly number[], string])[] = [
  [[0x50, 0x4b, 0x03, 0x04], 'a zip archive or a spreadsheet workbook (.xlsx)'],
  [[0x50, 0x4b, 0x05, 0x06], 'an empty zip archive'],
  [[0xd0, 0xcf, 0x11, 0xe0], 'an old spreadsheet workbook (.xls)'],
  [[0x1f, 0x8b], 'a gzip archive'],
  [[0x4d, 0x5a], 'a program for Windows'],
  [[0x7f, 0x45, 0x4c, 0x46], 'a program for Linux'],
  [[0x25, 0x50, 0x44, 0x46], 'a PDF document'],
  [[0x89, 0x50, 0x4e, 0x47], 'a picture (PNG)'],
  [[0xff, 0xd8, 0xff], 'a picture (JPEG)'],
  [[0x52, 0x61, 0x72, 0x21], 'a RAR archive'],
  [[0x37, 0x7a, 0xbc, 0xaf], 'a 7z archive'],
];

/** What a file really is by its first bytes, when it is not text; undefined for text. */
export function knownContent(bytes: Uint8Array): string | undefined {
  return SIGNATURES.find(([signature]) =>
    signature.every((byte, index) => bytes[index] === byte),
  )?.[1];
}

/** Decodes a text file; anything that is not text is refused by the name of what it is. */
export function decodeText(bytes: Uint8Array): DecodeResult {
  const known = knownContent(bytes);
  if (known) return { state: 'refused', what: known };
  const utf16 =
    (bytes[0] === 0xff && bytes[1] === 0xfe) || (bytes[0] === 0xfe && bytes[1] === 0xff);
  if (utf16) {
    const label = bytes[0] === 0xff ? 'utf-16le' : 'utf-16be';
    return decoded(new TextDecoder(label).decode(bytes), 'UTF-16', true);
  }
  if (bytes.includes(0)) return { state: 'refused', what: 'binary data (it holds zero bytes)' };
  const mark = bytes[0] === 0xef && bytes[1] === 0xbb && bytes[2] === 0xbf;
  try {
    return decoded(new TextDecoder('utf-8', { fatal: true }).decode(bytes), 'UTF-8', mark);
  } catch (error) {
    if (!isNotUtf8(error)) throw error;
    return decoded(new TextDecoder('windows-1252').decode(bytes), 'Windows-1252', false);
  }
}

const decoded = (text: string, encoding: DecodedText['encoding'], mark: boolean): DecodeResult => ({
  state: 'text',
  decoded: { text: text.replace(/^\ufeff/, ''), encoding, mark },
});

/** What a strict decoder throws; told by its name, since it may come from another realm. */
const isNotUtf8 = (error: unknown): boolean =>
  typeof error === 'object' && error !== null && 'name' in error && error.name === 'TypeError';
