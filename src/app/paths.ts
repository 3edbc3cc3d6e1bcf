/**
 * Every address of the application. The router, axe, the screenshots and the permission table walk this list.
 * `who` is the kind of person who opens it.
 */
export const paths = {
  home: { pattern: '/', who: 'anyone' },
  how: { pattern: '/how', who: 'anyone' },
  verdict: { pattern: '/verdicts/:slug', who: 'anyone' },
  verdictNumber: { pattern: '/v/:number', who: 'anyone' },
  publicRound: { pattern: '/rounds/:round', who: 'anyone' },
  signIn: { pattern: '/sign-in', who: 'anyone' },
  signUp: { pattern: '/sign-up', who: 'anyone' },
  forgot: { pattern: '/forgot', who: 'anyone' },
  reset: { pattern: '/reset/:token', who: 'anyone' },
  join: { pattern: '/join/:token', who: 'anyone' },
  seat: { pattern: '/seat/:seat', who: 'panelist' },
  account: { pattern: '/account', who: 'organiser' },
  panel: { pattern: '/p/:panel', who: 'organiser' },
  units: { pattern: '/p/:panel/units', who: 'organiser' },
  people: { pattern: '/p/:panel/people', who: 'organiser' },
  settings: { pattern: '/p/:panel/settings', who: 'organiser' },
  rounds: { pattern: '/p/:panel/rounds', who: 'organiser' },
  newRound: { pattern: '/p/:panel/rounds/new', who: 'organiser' },
  importRound: { pattern: '/p/:panel/import', who: 'organiser' },
  editRound: { pattern: '/p/:panel/rounds/:round/edit', who: 'organiser' },
  plan: { pattern: '/p/:panel/rounds/:round/plan', who: 'organiser' },
  progress: { pattern: '/p/:panel/rounds/:round/progress', who: 'organiser' },
  links: { pattern: '/p/:panel/rounds/:round/links', who: 'organiser' },
  table: { pattern: '/p/:panel/rounds/:round/table/:sitting', who: 'steward' },
  tags: { pattern: '/p/:panel/rounds/:round/tags/:sitting', who: 'keeper' },
  agreement: { pattern: '/p/:panel/rounds/:round/agreement', who: 'organiser' },
  reveal: { pattern: '/p/:panel/rounds/:round/reveal', who: 'organiser' },
  publish: { pattern: '/p/:panel/rounds/:round/verdict', who: 'organiser' },
  mailbox: { pattern: '/demo/mailbox', who: 'anyone' },
} as const

export type PathName = keyof typeof paths
type ParamNames<P extends string> = P extends `${string}:${infer Name}/${infer Rest}`
  ? Name | ParamNames<`/${Rest}`>
  : P extends `${string}:${infer Name}`
    ? Name
    : never

/** The address of a page, e.g. `to('plan', { panel: 'quayside-bench', round: id })`. */
export function to<N extends PathName>(
  name: N,
  ...params: ParamNames<(typeof paths)[N]['pattern']> extends never
    ? []
    : [Record<ParamNames<(typeof paths)[N]['pattern']>, string>]
): string {
  const values = (params[0] ?? {}) as Record<string, string>
  return paths[name].pattern.replace(/:(\w+)/g, (_, key: string) => encodeURIComponent(values[key] ?? ''))
}
