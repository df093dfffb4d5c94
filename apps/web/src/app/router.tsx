import { createBrowserRouter } from 'react-router-dom';
import { PageLoading } from '../components/PageLoading';
import { ErrorPage } from '../pages/ErrorPage';
import { NotFoundPage } from '../pages/NotFoundPage';
import { GuestOnly, SignedIn } from './gates';

/** Every page is loaded when it is first needed. */
export const router = createBrowserRouter([
  {
    lazy: async () => ({ Component: (await import('./Layout')).Layout }),
    errorElement: <ErrorPage />,
    HydrateFallback: PageLoading,
    children: [
      { path: '/', lazy: async () => ({ Component: (await import('../pages/HomePage')).HomePage }) },
      {
        path: '/check-take',
        lazy: async () => ({ Component: (await import('../pages/CheckTakePage')).CheckTakePage }),
      },
      {
        path: '/sample',
        lazy: async () => ({ Component: (await import('../pages/SamplePage')).SamplePage }),
      },
      {
        element: <GuestOnly />,
        children: [
          { path: '/join', lazy: async () => ({ Component: (await import('../pages/JoinPage')).JoinPage }) },
          {
            path: '/sign-in',
            lazy: async () => ({ Component: (await import('../pages/SignInPage')).SignInPage }),
          },
        ],
      },
      {
        path: '/forgot',
        lazy: async () => ({ Component: (await import('../pages/ForgotPage')).ForgotPage }),
      },
      {
        path: '/reset/:token',
        lazy: async () => ({ Component: (await import('../pages/ResetPage')).ResetPage }),
      },
      {
        path: '/new-address/:token',
        lazy: async () => ({ Component: (await import('../pages/NewAddressPage')).NewAddressPage }),
      },
      {
        path: '/unsubscribe/:token',
        lazy: async () => ({ Component: (await import('../pages/UnsubscribePage')).UnsubscribePage }),
      },
      {
        path: '/verify/:token',
        lazy: async () => ({ Component: (await import('../pages/VerifyPage')).VerifyPage }),
      },
      {
        element: <SignedIn />,
        children: [
          {
            path: '/tryouts',
            lazy: async () => ({ Component: (await import('../pages/TryOutsPage')).TryOutsPage }),
          },
          {
            path: '/tryouts/new',
            lazy: async () => ({ Component: (await import('../pages/NewTryOutPage')).NewTryOutPage }),
          },
          {
            path: '/tryouts/:tryOutId',
            lazy: async () => ({ Component: (await import('../pages/TryOutPage')).TryOutPage }),
          },
          {
            path: '/takes',
            lazy: async () => ({ Component: (await import('../pages/TakesPage')).TakesPage }),
          },
          {
            path: '/setups',
            lazy: async () => ({ Component: (await import('../pages/SetupsPage')).SetupsPage }),
          },
          {
            path: '/setups/new',
            lazy: async () => ({ Component: (await import('../pages/NewSetupPage')).NewSetupPage }),
          },
          {
            path: '/setups/:setupId',
            lazy: async () => ({ Component: (await import('../pages/SetupPage')).SetupPage }),
          },
          {
            path: '/progress',
            lazy: async () => ({ Component: (await import('../pages/ProgressPage')).ProgressPage }),
          },
          {
            path: '/rooms',
            lazy: async () => ({ Component: (await import('../pages/RoomsPage')).RoomsPage }),
          },
          {
            path: '/rooms/:roomId',
            lazy: async () => ({ Component: (await import('../pages/RoomPage')).RoomPage }),
          },
          {
            path: '/rooms/:roomId/calculator',
            lazy: async () => ({
              Component: (await import('../pages/RoomCalculatorPage')).RoomCalculatorPage,
            }),
          },
          {
            path: '/admin',
            lazy: async () => ({ Component: (await import('../pages/AdminPage')).AdminPage }),
          },
          {
            path: '/links',
            lazy: async () => ({ Component: (await import('../pages/LinksPage')).LinksPage }),
          },
          {
            path: '/settings',
            lazy: async () => ({ Component: (await import('../pages/SettingsPage')).SettingsPage }),
          },
          {
            path: '/takes/new',
            lazy: async () => ({ Component: (await import('../pages/NewTakePage')).NewTakePage }),
          },
          {
            path: '/compare/:beforeId/:afterId',
            lazy: async () => ({ Component: (await import('../pages/ComparePage')).ComparePage }),
          },
          {
            path: '/takes/:takeId',
            lazy: async () => ({ Component: (await import('../pages/SheetPage')).SheetPage }),
          },
        ],
      },
      { path: '*', element: <NotFoundPage /> },
    ],
  },
  {
    errorElement: <ErrorPage />,
    HydrateFallback: PageLoading,
    children: [
      {
        path: '/s/:token',
        lazy: async () => ({ Component: (await import('../pages/SharedPage')).SharedPage }),
      },
      {
        path: '/phone/:token',
        lazy: async () => ({ Component: (await import('../pages/PhonePage')).PhonePage }),
      },
      {
        element: <SignedIn />,
        children: [
          {
            path: '/takes/:takeId/big',
            lazy: async () => ({ Component: (await import('../pages/BigPrintPage')).BigPrintPage }),
          },
        ],
      },
    ],
  },
]);
