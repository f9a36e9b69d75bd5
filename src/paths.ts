/** Every address of the page, once. */
export const paths = {
  home: '/',
  signIn: '/sign-in',
  signInLink: (token: string) => `/welcome/${token}`,
  procedures: '/procedures',
  procedure: (id: string) => `/procedures/${id}`,
  doseReports: '/dose-reports',
  staffExposure: '/staff-exposure',
  myExposure: '/my-exposure',
  garments: '/garments',
  methods: '/methods',
  administration: '/admin',
} as const;

/** The sign-in page, which leads back to where the person wanted to go. */
export const buildSignInPath = (next: string): string =>
  next === paths.home ? paths.signIn : `${paths.signIn}?next=${encodeURIComponent(next)}`;

/** Only addresses of this page are followed after sign-in. */
export const readNextPath = (next: string | null): string =>
  next !== null && /^\/(?![/\\])/.test(next) ? next : paths.home;
