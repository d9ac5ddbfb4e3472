import type { Response } from 'express';
import type { PrintedWorking } from './working-prints.service.js';

/** Answers with a PDF that a browser shows, and keeps under its name. */
export function sendPdf(response: Response, { name, pdf }: PrintedWorking): void {
  response.type('application/pdf').set('Content-Disposition', `inline; filename="${name}"`).send(pdf);
}
