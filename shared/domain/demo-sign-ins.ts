export interface DemoSignIn {
  name: string
  email: string
  password: string
  /** What this person may do, for the demo's sign-in page and the console. */
  does: string
}

/** The invented people who may sign in to the demo, and nowhere else. The first one organises. */
export const demoSignIns: readonly [DemoSignIn, ...DemoSignIn[]] = [
  { name: 'Ines Falk', email: 'ines@example.org', password: 'harbour at dusk', does: 'organises rounds' },
  { name: 'Tomas Reyk', email: 'tomas@example.org', password: 'harbour at dusk', does: 'tags the pouches' },
  {
    name: 'Wanda Osei',
    email: 'wanda@example.org',
    password: 'harbour at dusk',
    does: 'stewards and listens',
  },
]
