import type { Logger } from 'pino';
import { openRoute, type Route } from '#server/http/registry.ts';
import { cspReportSchema } from '#shared/schemas/csp-report.ts';

/** An address without what may be personal in it: no query, no fragment. */
const bare = (address: string): string => address.replace(/[?#].*$/s, '');

/** What browsers tell of blocked content, by themselves, in the form of the Content Security Policy. */
export const contentPolicyRoutes = (log: Logger): Route[] => [
  openRoute({
    method: 'post',
    path: '/csp-report',
    access: 'anyone',
    accepts: 'application/csp-report',
    limit: 'reports',
    body: cspReportSchema,
    run: async ({ body: { 'csp-report': report } }) => {
      const directive = report['effective-directive'] ?? report['violated-directive'];
      log.warn(
        { directive, blocked: bare(report['blocked-uri']), page: bare(report['document-uri']) },
        'blocked content',
      );
    },
  }),
];
