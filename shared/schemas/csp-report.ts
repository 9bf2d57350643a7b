import { z } from 'zod';

const text = z.string().max(2000);

/** A violation report as browsers send it to report-uri (W3C Content Security Policy Level 3, section 5.3). */
export const cspReportSchema = z.object({
  'csp-report': z.object({
    'document-uri': text,
    'blocked-uri': text,
    'violated-directive': text.optional(),
    'effective-directive': text.optional(),
  }),
});
