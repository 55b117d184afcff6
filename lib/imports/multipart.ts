import 'server-only';
import { createHash, randomUUID } from 'node:crypto';
import { createWriteStream } from 'node:fs';
import { rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Readable, Transform } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import type { ReadableStream as WebStream } from 'node:stream/web';
import busboy from 'busboy';
import { AppError, badInput, tooLarge } from '@/lib/errors';
import { MOST_FILE_MB } from './limits';
import { sniffFile } from './read-file';

export const MOST_FILE_BYTES = MOST_FILE_MB * 1024 * 1024;
const MOST_FIELD_BYTES = 64 * 1024;
/** So much of a file tells whether it is a table at all. */
const SNIFF_BYTES = 4096;

/** A file that lies in a temporary folder, with the fields that came beside it. */
export type ReceivedFile = { path: string; fileName: string; size: number; sha256: string };
export type ReceivedForm = { file: ReceivedFile; fields: Map<string, string> };

const noForm = (message: string) => badInput([{ path: 'file', message }]);
const fileTooLarge = () => tooLarge(`The file is larger than ${MOST_FILE_MB} MB. Send it in parts.`);

/** Looks at the first bytes as they pass, counts and fingerprints the rest. */
const inspect = (fileName: string) => {
  const hash = createHash('sha256');
  let size = 0;
  let head: Buffer | null = Buffer.alloc(0);
  const sniff = () => {
    if (head) sniffFile(head, fileName);
    head = null;
  };
  const stream = new Transform({
    transform(bytes: Buffer, _encoding, done) {
      size += bytes.length;
      hash.update(bytes);
      try {
        if (head) head = Buffer.concat([head, bytes]);
        if (head && head.length >= SNIFF_BYTES) sniff();
        done(null, bytes);
      } catch (error) {
        done(error instanceof Error ? error : new Error(String(error)));
      }
    },
    flush(done) {
      try {
        sniff();
        done();
      } catch (error) {
        done(error instanceof Error ? error : new Error(String(error)));
      }
    },
  });
  return { stream, result: () => ({ size, sha256: hash.digest('hex') }) };
};

const receive = async (request: Request, path: string): Promise<ReceivedForm> => {
  if (!request.body) throw noForm('Send the file as multipart/form-data.');
  const fields = new Map<string, string>();
  let taking: Promise<ReceivedFile> | undefined;
  const form = busboy({
    headers: { 'content-type': request.headers.get('content-type') ?? '' },
    defParamCharset: 'utf8',
    limits: { files: 1, fileSize: MOST_FILE_BYTES, fields: 10, fieldSize: MOST_FIELD_BYTES },
  });
  let fault: Error | undefined;
  // Later, because busboy cannot be ended from within its own events.
  const refuse = (error: Error) => {
    fault ??= error;
    process.nextTick(() => form.destroy(error));
  };
  form.on('field', (name, value, { valueTruncated }) => {
    if (valueTruncated) refuse(tooLarge(`The field “${name}” is too long.`));
    else fields.set(name, value);
  });
  form.on('file', (name, stream, { filename }) => {
    if (name !== 'file') return void stream.resume();
    const fileName = filename?.trim() || 'unnamed file';
    const { stream: inspected, result } = inspect(fileName);
    stream.on('limit', () => refuse(fileTooLarge()));
    taking = pipeline(stream, inspected, createWriteStream(path)).then(() => ({ path, fileName, ...result() }));
    // A file that is refused at its first bytes ends the reading of the form.
    taking.catch(refuse);
  });
  // The web stream of a request and the one of node:stream/web are one thing under two type names.
  await pipeline(Readable.fromWeb(request.body as WebStream<Uint8Array>), form).catch((error: Error) => refuse(error));
  if (fault) throw fault;
  if (!taking) throw noForm('No file came with the request.');
  return { file: await taking, fields };
};

/**
 * Receives a multipart form with one file in flat memory and hands it to `use`; the temporary copy is gone afterwards.
 * Throws 400 when it is no such form, 413 when the file is too large, 422 when its first bytes are no table.
 */
export const withReceivedForm = async <T>(request: Request, use: (form: ReceivedForm) => Promise<T>): Promise<T> => {
  // A form's own lines come on top of the file.
  if (Number(request.headers.get('content-length') ?? 0) > MOST_FILE_BYTES + 1024 * 1024) throw fileTooLarge();
  const path = join(tmpdir(), `tarebook-${randomUUID()}`);
  try {
    const form = await receive(request, path).catch((error: unknown) => {
      if (error instanceof AppError) throw error;
      throw new AppError(400, 'Bad input', 'The request is no complete multipart form with a file.', [], {
        cause: error,
      });
    });
    return await use(form);
  } finally {
    await rm(path, { force: true });
  }
};
