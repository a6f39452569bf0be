import type { Request, RequestHandler } from 'express';
import multer from 'multer';
import type { Context } from '../context';
import { ServiceError } from '../service-error';
import type { OriginalFiles } from '../sweeps/original-files';

/** Most files one batch takes. */
const MOST_FILES = 2000;
/** The plan of a full batch. */
const MOST_FIELD_BYTES = 4 * 1024 * 1024;

/** Longest file name of the common file systems. */
const MOST_NAME_LENGTH = 255;

/** Reads one file into memory. */
export function uploadOne(context: Context, field: string): RequestHandler {
  return orInvalid(form(context, multer.memoryStorage(), 1).single(field));
}

/** Keeps each file as an original as soon as it is there, so that memory holds one at a time. */
export function uploadMany(context: Context, field: string): RequestHandler {
  return orInvalid(form(context, intoOriginals(context.originals), MOST_FILES).array(field, MOST_FILES));
}

function form(context: Context, storage: multer.StorageEngine, files: number): multer.Multer {
  return multer({
    storage,
    limits: { fileSize: context.config.maxUploadBytes, files, fields: 4, fieldSize: MOST_FIELD_BYTES },
    defParamCharset: 'utf8',
    fileFilter: (_request, file, done) => {
      file.originalname = plainName(file.originalname);
      done(null, true);
    },
  });
}

/** Without what cannot be seen: line breaks, and marks that make a name read as another. */
function plainName(name: string): string {
  return name.replace(/[\p{Cc}\p{Cf}]/gu, '').slice(0, MOST_NAME_LENGTH) || 'unnamed';
}

/** A form that breaks off or is none is the sender's fault; faults of disk and database carry a code and stay ours. */
function orInvalid(read: RequestHandler): RequestHandler {
  return (request, response, next) =>
    read(request, response, (error?: unknown) => {
      const isForm = error instanceof Error && error.name === 'Error' && !('code' in error);
      next(isForm ? new ServiceError('invalid', `upload: ${error.message}`) : error);
    });
}

/** The kept file's SHA-256 becomes its `filename`. One whose upload breaks off is never kept. */
function intoOriginals(originals: OriginalFiles): multer.StorageEngine {
  return {
    _handleFile: (_request, file, done) => {
      const chunks: Buffer[] = [];
      const stream = file.stream as typeof file.stream & { truncated?: boolean };
      stream.on('data', (chunk: Buffer) => chunks.push(chunk));
      stream.on('error', done);
      stream.on('end', () => {
        try {
          const bytes = Buffer.concat(chunks);
          // A file cut off at the largest size is refused by multer, which waits to be told that it was dealt with.
          done(null, { filename: stream.truncated ? '' : originals.keep(bytes), size: bytes.length });
        } catch (error) {
          done(error);
        }
      });
    },
    // What no sweep and no batch names is swept away at night.
    _removeFile: (_request, _file, done) => done(null),
  };
}

/** The uploaded file. @throws ServiceError `invalid` when there is none */
export function uploadedFile(request: Request, field: string): Express.Multer.File {
  if (request.file === undefined)
    throw new ServiceError('invalid', `${field}: send the file in the form field "${field}"`);
  return request.file;
}

/**
 * A form field that holds JSON.
 *
 * @param absent what a field that is left out means; without it the field must be there
 * @throws ServiceError `invalid` when it is missing or no JSON
 */
export function jsonField(request: Request, field: string, absent?: unknown): unknown {
  const body: unknown = request.body;
  const text = Object.entries(body ?? {}).find(([name]) => name === field)?.[1] as unknown;
  if (text === undefined && absent !== undefined) return absent;
  if (typeof text !== 'string') throw new ServiceError('invalid', `${field}: send JSON in the form field "${field}"`);
  try {
    return JSON.parse(text) as unknown;
  } catch (error) {
    throw new ServiceError(
      'invalid',
      `${field}: is no JSON: ${error instanceof Error ? error.message : String(error)}`,
    );
  }
}
