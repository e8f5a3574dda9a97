const SIGNATURES: readonly { readonly bytes: readonly number[]; readonly kind: string }[] = [
  { bytes: [0x25, 0x50, 0x44, 0x46, 0x2d], kind: 'a PDF document' },
  { bytes: [0x50, 0x4b, 0x03, 0x04], kind: 'a ZIP archive or a spreadsheet workbook' },
  { bytes: [0x1f, 0x8b], kind: 'a gzip archive' },
  { bytes: [0x42, 0x5a, 0x68], kind: 'a bzip2 archive' },
  { bytes: [0xfd, 0x37, 0x7a, 0x58, 0x5a], kind: 'an xz archive' },
  { bytes: [0x37, 0x7a, 0xbc, 0xaf, 0x27], kind: 'a 7z archive' },
  { bytes: [0x52, 0x61, 0x72, 0x21], kind: 'a RAR archive' },
  { bytes: [0x28, 0xb5, 0x2f, 0xfd], kind: 'a zstd archive' },
  { bytes: [0xd0, 0xcf, 0x11, 0xe0], kind: 'an old spreadsheet workbook' },
  { bytes: [0x89, 0x50, 0x4e, 0x47], kind: 'a PNG picture' },
  { bytes: [0xff, 0xd8, 0xff], kind: 'a JPEG picture' },
];

/** What a file really is when its first bytes say that it is no text; null when they do not. */
export function foreignKind(head: Uint8Array): string | null {
  const found = SIGNATURES.find(({ bytes }) => bytes.every((byte, at) => head[at] === byte));
  if (found) return found.kind;
  const text = Buffer.from(head.subarray(0, 200)).toString('latin1').trimStart().toLowerCase();
  return text.startsWith('<!doctype html') || text.startsWith('<html') ? 'a web page' : null;
}
