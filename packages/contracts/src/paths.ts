/** Every path of the API, so that neither side spells one by hand. */
export const paths = {
  join: '/api/auth/join',
  signIn: '/api/auth/sign-in',
  refresh: '/api/auth/refresh',
  signOut: '/api/auth/sign-out',
  me: '/api/me',
  takes: '/api/takes',
  take: (takeId: string) => `/api/takes/${takeId}`,
  measurement: (takeId: string) => `/api/takes/${takeId}/measurement`,
  cancelMeasurement: (takeId: string) => `/api/takes/${takeId}/measurement/cancel`,
  report: (takeId: string) => `/api/takes/${takeId}/report`,
  pairSpectrum: (takeId: string) => `/api/takes/${takeId}/pair-spectrum`,
  excerpt: (takeId: string) => `/api/takes/${takeId}/excerpt`,
  listen: (takeId: string) => `/api/takes/${takeId}/listen.wav`,
  takeFile: (takeId: string, fileId: string) => `/api/takes/${takeId}/files/${fileId}`,
  health: '/api/health',
  docs: '/api/docs',
} as const;

/** Writes carry this header; a page of another origin can't send it without a preflight, which is refused. */
export const appHeader = { name: 'X-Thudline', value: '1' } as const;
