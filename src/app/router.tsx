import { createBrowserRouter, Outlet } from 'react-router-dom';
import { PageSkeleton } from '#src/components/skeleton.tsx';
import * as today from '#src/routes/today.tsx';
import { NotFoundPage, PageError, WholePageError } from './error-pages.tsx';
import { LayoutShell } from './layout-shell.tsx';
import { landing, requireMe } from './require-me.ts';

/** Every page. Each loads its own code when it is first visited. */
export const router = createBrowserRouter([
  {
    ErrorBoundary: WholePageError,
    HydrateFallback: PageSkeleton,
    Component: Outlet,
    children: [
      { path: '/', loader: landing, Component: PageSkeleton },
      { path: '/sign-in', lazy: () => import('#src/routes/sign-in-school.tsx') },
      { path: '/sign-in/:code', lazy: () => import('#src/routes/sign-in.tsx') },
      // A running set has no navigation: one way out, named Leave.
      { path: '/sets/:id', loader: requireMe, children: [{ index: true, lazy: () => import('#src/routes/set.tsx') }] },
      {
        loader: requireMe,
        Component: LayoutShell,
        children: [
          {
            ErrorBoundary: PageError,
            children: [
              // Most visits start here, so its code comes with the app's own: one request less, and fewer bytes.
              { path: '/today', Component: today.Component, loader: today.loader },
              { path: '/set/:kind', lazy: () => import('#src/routes/set-open.tsx') },
              { path: '/sets/:id/summary', lazy: () => import('#src/routes/set-summary.tsx') },
              { path: '/topics', lazy: () => import('#src/routes/topics.tsx') },
              { path: '/home', lazy: () => import('#src/routes/home.tsx') },
              { path: '/password', lazy: () => import('#src/routes/password.tsx') },
              {
                lazy: () => import('./staff-layout.tsx'),
                children: [
                  { path: '/questions', lazy: () => import('#src/routes/questions.tsx') },
                  { path: '/questions/new', lazy: () => import('#src/routes/question-new.tsx') },
                  { path: '/questions/:id', lazy: () => import('#src/routes/question.tsx') },
                  { path: '/review', lazy: () => import('#src/routes/review.tsx') },
                  { path: '/subjects', lazy: () => import('#src/routes/subjects.tsx') },
                  { path: '/subjects/:subjectId/topics', lazy: () => import('#src/routes/subject-topics.tsx') },
                  { path: '/estimates', lazy: () => import('#src/routes/estimates.tsx') },
                  { path: '/item-statistics', lazy: () => import('#src/routes/item-statistics.tsx') },
                  { path: '/settings/practice', lazy: () => import('#src/routes/settings-practice.tsx') },
                ],
              },
            ],
          },
        ],
      },
      { path: '*', Component: NotFoundPage },
    ],
  },
]);
