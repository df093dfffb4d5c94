import type { ShareSubject } from './shares';

/** Every path of the API, so that neither side spells one by hand. */
export const paths = {
  join: '/api/auth/join',
  signIn: '/api/auth/sign-in',
  refresh: '/api/auth/refresh',
  signOut: '/api/auth/sign-out',
  forgot: '/api/auth/forgot',
  reset: '/api/auth/reset',
  verify: '/api/auth/verify',
  resendVerification: '/api/auth/verify/resend',
  changePassword: '/api/auth/password',
  phoneLinks: '/api/auth/phone-links',
  openPhoneLink: '/api/auth/phone-links/open',
  me: '/api/me',
  progress: '/api/me/progress',
  changeEmail: '/api/auth/email',
  confirmEmail: '/api/auth/email/confirm',
  sessions: '/api/me/sessions',
  session: (sessionId: string) => `/api/me/sessions/${sessionId}`,
  deletion: '/api/me/deletion',
  export: '/api/me/export',
  exportFile: (exportId: string) => `/api/me/export/${exportId}/file`,
  events: '/api/events',
  sampleSheet: '/api/sample-sheet',
  shares: '/api/shares',
  /** The links of one subject; ids and kinds need no escaping. */
  sharesOf: (subject: ShareSubject) =>
    `/api/shares?${Object.entries(subject)
      .map((pair) => pair.join('='))
      .join('&')}`,
  openShare: '/api/shares/open',
  share: (shareId: string) => `/api/shares/${shareId}`,
  photo: (photoId: string) => `/api/photos/${photoId}`,
  setups: '/api/setups',
  setup: (setupId: string) => `/api/setups/${setupId}`,
  setupPhoto: (setupId: string) => `/api/setups/${setupId}/photo`,
  rooms: '/api/rooms',
  room: (roomId: string) => `/api/rooms/${roomId}`,
  roomChanges: (roomId: string) => `/api/rooms/${roomId}/changes`,
  roomChange: (roomId: string, changeId: string) => `/api/rooms/${roomId}/changes/${changeId}`,
  roomTrend: (roomId: string) => `/api/rooms/${roomId}/trend`,
  takes: '/api/takes',
  sameFiles: '/api/takes/same-files',
  take: (takeId: string) => `/api/takes/${takeId}`,
  measurement: (takeId: string) => `/api/takes/${takeId}/measurement`,
  cancelMeasurement: (takeId: string) => `/api/takes/${takeId}/measurement/cancel`,
  measureAgain: (takeId: string) => `/api/takes/${takeId}/measurement/again`,
  restoreTake: (takeId: string) => `/api/takes/${takeId}/restore`,
  peaks: (takeId: string) => `/api/takes/${takeId}/peaks`,
  report: (takeId: string) => `/api/takes/${takeId}/report`,
  pairSpectrum: (takeId: string) => `/api/takes/${takeId}/pair-spectrum`,
  /** The take before, then the take after. */
  comparison: (takeId: string, otherTakeId: string) => `/api/takes/${takeId}/compare/${otherTakeId}`,
  excerpt: (takeId: string) => `/api/takes/${takeId}/excerpt`,
  listen: (takeId: string) => `/api/takes/${takeId}/listen.wav`,
  addedFiles: (takeId: string) => `/api/takes/${takeId}/added-files`,
  addedFile: (takeId: string, addedFileId: string) => `/api/takes/${takeId}/added-files/${addedFileId}`,
  addedFileDownload: (takeId: string, addedFileId: string) =>
    `/api/takes/${takeId}/added-files/${addedFileId}/file`,
  addedFileListen: (takeId: string, addedFileId: string) =>
    `/api/takes/${takeId}/added-files/${addedFileId}/listen.wav`,
  takeFile: (takeId: string, fileId: string) => `/api/takes/${takeId}/files/${fileId}`,
  tryOuts: '/api/tryouts',
  tryOut: (tryOutId: string) => `/api/tryouts/${tryOutId}`,
  tryOutPlace: (tryOutId: string, placeId: string) => `/api/tryouts/${tryOutId}/places/${placeId}`,
  tryOutRanking: (tryOutId: string) => `/api/tryouts/${tryOutId}/ranking`,
  health: '/api/health',
  docs: '/api/docs',
} as const;

/** Writes carry this header; a page of another origin can't send it without a preflight, which is refused. */
export const appHeader = { name: 'X-Thudline', value: '1' } as const;
