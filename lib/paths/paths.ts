/** Every address of the product, made in one place; the organisation stands in each that belongs to one. */
export const paths = {
  home: '/',
  signIn: '/sign-in',
  preferences: '/preferences',
  methods: '/methods',
  /** The phone's one page; where in it one is stands in the query, so that it can be kept and opened without a network. */
  round: '/round',
  link: (secret: string) => `/link/${secret}`,
  organisation: (org: string) => `/o/${org}`,
  farms: (org: string) => `/o/${org}/farms`,
  farm: (org: string, farm: string) => `/o/${org}/farms/${farm}`,
  field: (org: string, field: string) => `/o/${org}/fields/${field}`,
  settings: (org: string) => `/o/${org}/settings`,
  people: (org: string) => `/o/${org}/people`,
  keptFile: (org: string) => `/o/${org}/kept-file`,
  changes: (org: string) => `/o/${org}/changes`,
  plan: (org: string, planting: string) => `/o/${org}/plantings/${planting}/plan`,
  count: (org: string, planting: string) => `/o/${org}/plantings/${planting}/count`,
  rowSample: (org: string, planting: string, rowSample: string) => `/o/${org}/plantings/${planting}/count/${rowSample}`,
  importFile: (org: string, planting: string) => `/o/${org}/plantings/${planting}/import`,
  scores: (org: string, planting: string) => `/o/${org}/plantings/${planting}/scores`,
  compare: (org: string, planting: string) => `/o/${org}/plantings/${planting}/compare`,
  decide: (org: string, planting: string) => `/o/${org}/plantings/${planting}/decide`,
};

/** The addresses of the interface between browser and server, mirroring the nouns. */
export const apiPaths = {
  signIn: '/api/sign-in',
  signOut: '/api/sign-out',
  preferences: '/api/preferences',
  password: '/api/password',
  openLink: '/api/links/open',
  round: '/api/round',
  roundDay: (org: string) => `/api/o/${org}/round-day`,
  photo: (org: string, photo: string) => `/api/o/${org}/photos/${photo}`,
  keptFiles: (org: string) => `/api/o/${org}/kept-files`,
  operations: (org: string) => `/api/o/${org}/operations`,
  noun: (org: string, noun: string) => `/api/o/${org}/${noun}`,
  scores: (org: string, planting: string) => `/api/o/${org}/plantings/${planting}/scores`,
  comparison: (org: string, planting: string) => `/api/o/${org}/plantings/${planting}/comparison`,
  replant: (org: string, planting: string) => `/api/o/${org}/plantings/${planting}/replant`,
};
