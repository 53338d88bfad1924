import type { RouteObject } from 'react-router-dom';

/** The pages that stand before the sign-in. */
export const entryRoutes: RouteObject[] = [
  {
    path: '/sign-in',
    lazy: async () => ({ Component: (await import('./SignInPage')).SignInPage }),
  },
  {
    path: '/sign-up',
    lazy: async () => ({ Component: (await import('../sign-up/SignUpPage')).SignUpPage }),
  },
  {
    path: '/reset-password',
    lazy: async () => ({
      Component: (await import('../reset-password/ResetPasswordPage')).ResetPasswordPage,
    }),
  },
  {
    path: '/reset-password/:token',
    lazy: async () => ({ Component: (await import('../reset-password/NewPasswordPage')).NewPasswordPage }),
  },
  {
    path: '/confirm/:token',
    lazy: async () => ({ Component: (await import('../confirm/ConfirmPage')).ConfirmPage }),
  },
  {
    path: '/invitations/:token',
    lazy: async () => ({ Component: (await import('../invitation/InvitationPage')).InvitationPage }),
  },
  {
    path: '/unsubscribe/:token',
    lazy: async () => ({ Component: (await import('../unsubscribe/UnsubscribePage')).UnsubscribePage }),
  },
];
