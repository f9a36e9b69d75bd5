/** Every address of the page, once. */
export const paths = {
  home: '/',
  signIn: '/sign-in',
  signInLink: (token: string) => `/welcome/${token}`,
  procedures: '/procedures',
  procedure: (id: string) => `/procedures/${id}`,
  procedureRecord: (id: string) => `/procedures/${id}/record`,
  enterByHand: '/procedures/enter',
  enterFigures: (id: string) => `/procedures/${id}/enter`,
  correctEntry: (id: string, entryId: string) => `/procedures/${id}/entries/${entryId}`,
  doseReports: '/dose-reports',
  staffExposure: '/staff-exposure',
  myExposure: '/my-exposure',
  garments: '/garments',
  garment: (id: string) => `/garments/${id}`,
  methods: '/methods',
  administration: '/admin',
  people: '/admin/people',
  person: (id: string) => `/admin/people/${id}`,
  rooms: '/admin/rooms',
  room: (id: string) => `/admin/rooms/${id}`,
  equipment: '/admin/equipment',
  machine: (id: string) => `/admin/equipment/${id}`,
  dataChecks: '/admin/data-checks',
  dataCheck: (code: string) => `/admin/data-checks/${code}`,
  procedureTypes: '/admin/procedure-types',
  procedureType: (id: string) => `/admin/procedure-types/${id}`,
} as const;

/** Stands for the id where a record is still to be added. */
export const newId = 'new';

/** The sign-in page, which leads back to where the person wanted to go. */
export const buildSignInPath = (next: string): string =>
  next === paths.home ? paths.signIn : `${paths.signIn}?next=${encodeURIComponent(next)}`;

/** Only addresses of this page are followed after sign-in. */
export const readNextPath = (next: string | null): string =>
  next !== null && /^\/(?![/\\])/.test(next) ? next : paths.home;
