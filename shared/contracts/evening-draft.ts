import { z } from 'zod'
import { limits } from '#shared/domain/limits.ts'
import { lexiconEntry } from '#shared/domain/lexicon.ts'
import { id, line, prose } from './text.ts'

const { eveningUnits, eveningListeners } = limits
export const levelMatchings = ['measured', 'by-ear', 'not-matched'] as const
export const duties = ['keeper', 'split', 'single'] as const

const person = z.strictObject({
  name: line(limits.name, 'Enter a name.'),
  listens: z.boolean(),
  /** What else this person does tonight. `letters` and `codes` are the halves of a split key; `keeper` may steward only in a single-blind round. */
  duty: z.enum(['none', 'keeper', 'letters', 'codes']).default('none'),
  steward: z.boolean().default(false),
  /** This row is the organiser, who is signed in. */
  you: z.boolean().default(false),
})

/** Listeners read these fields before closing, so no unit's or maker's name may stand in them. */
function refuseNames(
  draft: {
    title: string
    question: string
    hiding: string
    sourceChain: string
    tracks: string[]
    units: { maker: string; name: string }[]
  },
  fault: (path: (string | number)[], message: string) => void,
): void {
  const read: [(string | number)[], string][] = [
    [['title'], draft.title],
    [['question'], draft.question],
    [['hiding'], draft.hiding],
    [['sourceChain'], draft.sourceChain],
    ...draft.tracks.map((track, index): [(string | number)[], string] => [['tracks', index], track]),
  ]
  const words = new Set(draft.units.flatMap((unit) => [unit.maker, unit.name]))
  for (const [path, text] of read)
    for (const word of words)
      if (word.length > 2 && text.toLocaleLowerCase('en').includes(word.toLocaleLowerCase('en')))
        fault(path, `Listeners read this: leave out “${word}”.`)
}

/** An evening as the organiser types it. Cross-field faults are named at the input they belong to. */
export const eveningDraft = z
  .strictObject({
    title: line(limits.title, 'Give the evening a title.'),
    question: line(limits.question, 'Say what you want to find out.'),
    units: z
      .array(
        z.strictObject({
          id: id.optional(),
          maker: line(limits.name, 'Enter the maker.'),
          name: line(limits.name, 'Enter the name.'),
        }),
      )
      .min(eveningUnits.least, `At least ${eveningUnits.least} units.`)
      .max(eveningUnits.most, `At most ${eveningUnits.most} units.`),
    people: z
      .array(person)
      .min(eveningListeners.least, 'At least two people.')
      .max(eveningListeners.most + 3, `At most ${eveningListeners.most} listeners.`),
    scorecard: z.array(z.string()).min(1, 'Pick at least one descriptor.').max(limits.descriptorsMost),
    primaryDescriptor: z.string().default('overall-liking'),
    tracks: z.array(line(limits.line, 'Name the track or remove the line.')).max(limits.tracks).default([]),
    sourceChain: prose(limits.line).default(''),
    levelMatching: z.enum(levelMatchings),
    hiding: line(limits.line, 'Say how shape and cable are hidden, or that they are not.'),
    tagging: z.enum(duties),
    publishesRows: z.boolean().default(true),
  })
  .superRefine((draft, context) => {
    const fault = (path: (string | number)[], message: string) =>
      context.addIssue({ code: 'custom', path, message })
    const once = (names: readonly string[], at: (index: number) => (string | number)[], message: string) => {
      const seen = new Set<string>()
      names.forEach((name, index) => {
        const key = name.toLocaleLowerCase('en')
        if (seen.has(key)) fault(at(index), message)
        seen.add(key)
      })
    }
    once(
      draft.units.map((unit) => `${unit.maker}\n${unit.name}`),
      (i) => ['units', i, 'name'],
      'This unit is listed twice. Two specimens need different names.',
    )
    once(
      draft.people.map((one) => one.name),
      (i) => ['people', i, 'name'],
      'Two people have this name. Add an initial.',
    )
    draft.scorecard.forEach((key, index) => {
      if (!lexiconEntry(key) || key === 'overall-liking')
        fault(['scorecard', index], 'Not a descriptor of the lexicon.')
    })
    once(draft.scorecard, (i) => ['scorecard', i], 'Listed twice.')
    if (draft.primaryDescriptor !== 'overall-liking' && !draft.scorecard.includes(draft.primaryDescriptor))
      fault(['primaryDescriptor'], 'The primary descriptor must be on the scorecard.')
    refuseNames(draft, fault)
    const listeners = draft.people.filter((one) => one.listens)
    if (listeners.length < eveningListeners.least) fault(['people'], 'At least two people must listen.')
    if (listeners.length > eveningListeners.most)
      fault(['people'], `At most ${eveningListeners.most} listeners.`)
    // Two spare rows and three sets of codes: more than 300 codes in one sitting cannot be kept apart.
    const most = Math.floor(limits.codesInSitting / (3 * draft.units.length)) - limits.spareRows
    if (draft.tagging !== 'split' && listeners.length > most)
      fault(
        ['people'],
        `With ${draft.units.length} units at most ${most} can listen: there are not enough three-digit codes for more.`,
      )
    const holding = (duty: string) => draft.people.filter((one) => one.duty === duty)
    const stewards = draft.people.filter((one) => one.steward)
    if (stewards.length !== 1) fault(['people'], 'Choose one steward.')
    const keepers = holding('keeper')
    if (draft.tagging === 'split') {
      if (holding('letters').length !== 1 || holding('codes').length !== 1)
        fault(['tagging'], 'A split key needs two people: one for the letters, another for the codes.')
      if (keepers.length > 0) fault(['tagging'], 'With a split key nobody keeps the whole key.')
    } else {
      if (keepers.length !== 1) fault(['tagging'], 'Choose the one person who tags the pouches.')
      if (holding('letters').length + holding('codes').length > 0)
        fault(['tagging'], 'Letters and codes belong to a split key.')
      const keeper = keepers[0]
      if (keeper?.listens) fault(['tagging'], 'Whoever tags the pouches knows the key and cannot listen.')
      if (keeper?.steward && draft.tagging === 'keeper')
        fault(['tagging'], 'The code keeper cannot steward: choose another steward, or a single-blind round.')
      if (keeper && !keeper.steward && draft.tagging === 'single')
        fault(['tagging'], 'In a single-blind round the keeper is the steward.')
    }
  })
export type EveningDraft = z.output<typeof eveningDraft>
export type EveningDraftInput = z.input<typeof eveningDraft>
