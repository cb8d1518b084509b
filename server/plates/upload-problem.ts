import { type MulterError } from 'multer';
import { Problem } from '../http/problem';

export const MOST_UPLOAD_MB = 80;

/** @returns what was wrong with a multipart body */
export function uploadProblem(error: MulterError): Problem {
  if (error.code === 'LIMIT_FILE_SIZE') {
    return new Problem(
      413,
      'picture-too-large',
      'The file is too large',
      `A picture may have up to ${MOST_UPLOAD_MB} MB. Nothing was stored; save it as JPEG and send that.`,
    );
  }
  const field = error.field === undefined ? '' : ` (field ${JSON.stringify(error.field.slice(0, 100))})`;
  return new Problem(
    422,
    'invalid-upload',
    'The upload is not as expected',
    `${error.message}${field}. Send one file as "picture", and "frame" if it is not 0. Nothing was stored.`,
  );
}
