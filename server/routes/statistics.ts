import type { Route } from '#server/http/registry.ts';

export const statisticsRoutes: Route[] = [];
