/** What the built-in mailbox shows of a message. */
export interface ReadMessage {
  readonly messageId: string;
  readonly subject: string;
  readonly text: string;
}

/** Reads the parts that our own mails have: two headers, and the first plain-text part in any of the usual encodings. */
export function readMessage(raw: string): ReadMessage {
  const { headers, body } = split(raw);
  return {
    messageId: header(headers, 'message-id'),
    subject: decodeWords(header(headers, 'subject')),
    text: plainText(headers, body).replaceAll('\r\n', '\n').trim(),
  };
}

function split(part: string): { headers: string; body: string } {
  const at = part.search(/\r?\n\r?\n/);
  return at < 0
    ? { headers: part, body: '' }
    : { headers: part.slice(0, at), body: part.slice(at).replace(/^\r?\n\r?\n/, '') };
}

/** A header by its name, folded lines joined. */
function header(headers: string, name: string): string {
  const unfolded = headers.replaceAll(/\r?\n[ \t]+/g, ' ');
  const line = unfolded.split(/\r?\n/).find((each) => each.toLowerCase().startsWith(`${name}:`));
  return line ? line.slice(name.length + 1).trim() : '';
}

function plainText(headers: string, body: string): string {
  const boundary = /boundary="?([^";\r\n]+)"?/i.exec(header(headers, 'content-type'))?.[1];
  if (!boundary) return decodeBody(body, header(headers, 'content-transfer-encoding'));
  const parts = body
    .split(`--${boundary}`)
    .slice(1, -1)
    .map((part) => split(part.replace(/^\r?\n/, '')));
  const plain =
    parts.find((part) => /^text\/plain/i.test(header(part.headers, 'content-type'))) ?? parts[0];
  return plain ? plainText(plain.headers, plain.body) : '';
}

function decodeBody(body: string, encoding: string): string {
  if (/base64/i.test(encoding)) return Buffer.from(body, 'base64').toString('utf8');
  if (/quoted-printable/i.test(encoding)) return quoted(body.replaceAll(/=\r?\n/g, ''));
  return body;
}

const quoted = (text: string): string =>
  Buffer.from(
    text.replaceAll(/=([0-9A-F]{2})/gi, (_whole, hex: string) =>
      String.fromCharCode(parseInt(hex, 16)),
    ),
    'latin1',
  ).toString('utf8');

/** Encoded words of a header (RFC 2047). */
function decodeWords(text: string): string {
  return text
    .replaceAll(/\?=\s+=\?/g, '?==?')
    .replaceAll(/=\?utf-8\?(b|q)\?([^?]*)\?=/gi, (_whole, kind: string, word: string) =>
      kind.toLowerCase() === 'b'
        ? Buffer.from(word, 'base64').toString('utf8')
        : quoted(word.replaceAll('_', ' ')),
    );
}
