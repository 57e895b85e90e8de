import type { Request, RequestHandler } from 'express';
import multer from 'multer';
import { unacceptable } from './failure';

/** One file in the field "file", held in memory below the configured size; never written under a name of the sender's. */
export function receiveFile(maxBytes: number): RequestHandler {
  const receive = multer({
    storage: multer.memoryStorage(),
    limits: {
      files: 1,
      fileSize: maxBytes,
      fields: 5,
      fieldSize: 10_000,
      parts: 8,
      headerPairs: 50,
    },
    defParamCharset: 'utf8',
  });
  return receive.single('file');
}

/** The received file with a name fit for display: no folders, no control characters, not too long. */
export function receivedFile(request: Request): { readonly name: string; readonly bytes: Buffer } {
  const file = request.file;
  if (!file) throw unacceptable('upload.missing', 'Choose a file to upload.', 'file');
  if (file.size === 0) throw unacceptable('upload.empty', 'The file is empty.', 'file');
  return { name: displayName(file.originalname), bytes: file.buffer };
}

/** Last part of a path, without control characters, at most 150 characters. */
export function displayName(given: string): string {
  const last = given.split(/[\\/]/).at(-1) ?? '';
  // eslint-disable-next-line no-control-regex -- control characters are what is taken out
  const clean = last.replaceAll(/[\u0000-\u001f\u007f]/g, '').trim();
  return clean.slice(-150) || 'file';
}
