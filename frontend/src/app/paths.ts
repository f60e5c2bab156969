const revisionAddress = (code: string, number: string, label: string) =>
  `/projects/${encodeURIComponent(code)}/specifications/${encodeURIComponent(number)}/revisions/${encodeURIComponent(label)}`;

/** Every address of the product once: the pattern that the router knows and the function that builds it. */
export const paths = {
  desk: { pattern: '/', to: () => '/' },
  projects: { pattern: '/projects', to: () => '/projects' },
  project: { pattern: '/projects/:code', to: (code: string) => `/projects/${encodeURIComponent(code)}` },
  designBasis: {
    pattern: '/projects/:code/basis',
    to: (code: string) => `/projects/${encodeURIComponent(code)}/basis`,
  },
  specification: {
    pattern: '/projects/:code/specifications/:number',
    to: (code: string, number: string) =>
      `/projects/${encodeURIComponent(code)}/specifications/${encodeURIComponent(number)}`,
  },
  approval: {
    pattern: '/projects/:code/specifications/:number/revisions/:label/approval',
    to: (code: string, number: string, label: string) => `${revisionAddress(code, number, label)}/approval`,
  },
  sheets: { pattern: '/sheets', to: () => '/sheets' },
  issuedSheet: { pattern: '/sheets/:id', to: (id: string) => `/sheets/${encodeURIComponent(id)}` },
  concessions: { pattern: '/concessions', to: () => '/concessions' },
  verify: {
    pattern: '/verify/:verificationCode?',
    to: (verificationCode?: string) =>
      verificationCode ? `/verify/${encodeURIComponent(verificationCode)}` : '/verify',
  },
  revision: {
    pattern: '/projects/:code/specifications/:number/revisions/:label',
    to: revisionAddress,
  },
  check: {
    pattern: '/projects/:code/specifications/:number/revisions/:label/check',
    to: (code: string, number: string, label: string) => `${revisionAddress(code, number, label)}/check`,
  },
  catalogue: { pattern: '/catalogue', to: () => '/catalogue' },
  catalogueUnit: { pattern: '/catalogue/:code', to: (code: string) => `/catalogue/${encodeURIComponent(code)}` },
  tables: { pattern: '/tables', to: () => '/tables' },
  table: { pattern: '/tables/:key', to: (key: string) => `/tables/${encodeURIComponent(key)}` },
  knownAnswers: { pattern: '/known-answers', to: () => '/known-answers' },
  risk: { pattern: '/risk', to: () => '/risk' },
  trail: {
    pattern: '/trail',
    /** Narrowed to one record, or to a specification with all its revisions. */
    to: (only: { entity: string; entityId: string } | { project: string; specification: string } | null = null) =>
      only ? `/trail?${new URLSearchParams(only).toString()}` : '/trail',
  },
  administration: { pattern: '/administration', to: () => '/administration' },
  account: { pattern: '/account', to: () => '/account' },
  signIn: {
    pattern: '/sign-in',
    to: (back?: string) => (back && back !== '/' ? `/sign-in?back=${encodeURIComponent(back)}` : '/sign-in'),
  },
  invitation: { pattern: '/invitation', to: () => '/invitation' },
  reset: { pattern: '/reset', to: () => '/reset' },
} as const;

/** An address inside this product to go back to; anything else leads to the desk. */
export function safeBack(back: string | null): string {
  return back && /^\/(?![/\\])/.test(back) ? back : paths.desk.to();
}
