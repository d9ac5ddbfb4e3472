import { Router, type RequestHandler } from 'express';
import multer, { MulterError } from 'multer';
import { badInput, HttpProblem } from '../platform/errors/http-problem.js';
import { uploadLimit } from '../platform/http/rate-limits.js';
import { allow } from '../platform/signing-in/authentication.js';
import { signedIn } from '../platform/signing-in/signed-in.js';
import { parseId } from '../platform/validation/parse-id.js';
import type { FilesService } from './files.service.js';

const largest = 12 * 1024 * 1024;

const upload = multer({
  storage: multer.memoryStorage(),
  limits: { fileSize: largest, files: 1, fields: 0, parts: 1, fieldNameSize: 50 },
}).single('file');

/** Reads one file of a form, into memory and never to a name that the sender chose. */
const oneFile: RequestHandler = (request, response, next) => {
  if (!request.is('multipart/form-data')) {
    throw new HttpProblem('unsupported-type', 'A photo is sent as a form with the field `file`.');
  }
  upload(request, response, (error?: unknown) => {
    next(error === undefined ? undefined : toTrouble(error));
  });
};

function toTrouble(error: unknown): unknown {
  if (error instanceof MulterError && error.code === 'LIMIT_FILE_SIZE') {
    return new HttpProblem('too-large', 'A photo may have at most 12 MB.');
  }
  return badInput({ field: 'file', message: 'Send one photo in the field `file`.' });
}

/** `/files`: photos. */
export function fileRoutes(files: FilesService): Router {
  const router = Router();
  router.post('/', allow('files.write'), uploadLimit(), oneFile, async (request, response) => {
    const bytes = request.file?.buffer;
    if (!bytes) throw badInput({ field: 'file', message: 'Send one photo in the field `file`.' });
    response.status(201).json(await files.add(signedIn(request), bytes));
  });
  router.get('/:id', allow('files.read'), async (request, response) => {
    const { mediaType, bytes } = await files.read(signedIn(request), parseId(request.params['id'], 'photo'));
    response
      .set({
        'Cache-Control': 'private, max-age=86400, immutable',
        'Content-Disposition': 'inline',
        'Content-Security-Policy': "default-src 'none'; sandbox",
      })
      .type(mediaType)
      .send(Buffer.from(bytes));
  });
  return router;
}
