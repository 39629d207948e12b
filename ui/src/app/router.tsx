import { type RouteObject } from 'react-router-dom';
import { LoadingState } from '@/components/LoadingState';
import { RouteError } from './RouteError';
import { RequireSession } from './RequireSession';

/** Every address and the screen that answers it; screens load when they are first wanted. */
export const routes: RouteObject[] = [
  {
    ErrorBoundary: RouteError,
    HydrateFallback: () => <LoadingState label="Opening" />,
    children: [
      { path: '/sign-in', lazy: () => import('@/routes/sign-in') },
      { path: '/invitation/:token', lazy: () => import('@/routes/invitation') },
      {
        Component: RequireSession,
        children: [
          {
            lazy: () => import('./Shell'),
            children: [
              {
                ErrorBoundary: RouteError,
                children: [
                  { path: '/', lazy: () => import('@/routes/bench') },
                  {
                    path: '/cases/:caseId',
                    lazy: () => import('@/routes/case'),
                    children: [
                      { index: true, lazy: () => import('@/routes/case-intake') },
                      { path: 'intake', lazy: () => import('@/routes/case-intake') },
                      { path: 'circuit', lazy: () => import('@/routes/case-circuit') },
                      { path: 'readings', lazy: () => import('@/routes/case-readings') },
                      { path: 'compare', lazy: () => import('@/routes/case-compare') },
                      { path: 'suspects', lazy: () => import('@/routes/case-suspects') },
                      { path: 'working', lazy: () => import('@/routes/case-working') },
                    ],
                  },
                  { path: '/families', lazy: () => import('@/routes/families') },
                  { path: '/families/:familyId', lazy: () => import('@/routes/family') },
                  { path: '/rules', lazy: () => import('@/routes/rules') },
                  { path: '/rules/:ruleId', lazy: () => import('@/routes/rule') },
                  { path: '/parts-data', lazy: () => import('@/routes/parts-data') },
                  { path: '/people', lazy: () => import('@/routes/people') },
                  { path: '*', lazy: () => import('@/routes/not-found') },
                ],
              },
            ],
          },
        ],
      },
    ],
  },
];
