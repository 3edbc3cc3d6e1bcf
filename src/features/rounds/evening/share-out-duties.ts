import type { EveningDraftInput } from '#shared/contracts/evening-draft.ts'

export type DraftPerson = EveningDraftInput['people'][number]
export type Tagging = EveningDraftInput['tagging']
export type Duty = 'keeper' | 'letters' | 'codes' | 'steward'

const dutiesOf: Record<Tagging, readonly Duty[]> = {
  keeper: ['keeper', 'steward'],
  single: ['keeper'],
  split: ['letters', 'codes', 'steward'],
}

/** Which duties somebody must be chosen for; in a single-blind round the keeper is the steward. */
export const dutiesFor = (tagging: Tagging): readonly Duty[] => dutiesOf[tagging]

const holds = (person: DraftPerson, duty: Duty): boolean =>
  duty === 'steward' ? person.steward === true : person.duty === duty

/** Who holds a duty, by place in the list; -1 where nobody does. */
export const holderOf = (people: readonly DraftPerson[], duty: Duty): number =>
  people.findIndex((person) => holds(person, duty))

/** Gives a duty to one person and takes it from all others. A code keeper knows the key, so they do not listen. */
export function giveDuty(
  people: readonly DraftPerson[],
  duty: Duty,
  holder: number,
  tagging: Tagging,
): DraftPerson[] {
  return people.map((person, index): DraftPerson => {
    const chosen = index === holder
    if (duty === 'steward') return { ...person, steward: chosen }
    const steward = duty === 'keeper' && tagging === 'single' ? chosen : person.steward === true
    if (!chosen) return { ...person, steward, duty: person.duty === duty ? 'none' : (person.duty ?? 'none') }
    return {
      ...person,
      duty,
      steward: duty === 'keeper' && tagging === 'keeper' ? false : steward,
      listens: duty === 'keeper' ? false : person.listens,
    }
  })
}

const firstFree = (people: readonly DraftPerson[], allowed: (person: DraftPerson) => boolean): number => {
  const free = people.findIndex(
    (person) => person.duty === 'none' && person.steward !== true && allowed(person),
  )
  return free >= 0 ? free : people.findIndex(allowed)
}

/** Which person takes an open duty if nobody is chosen: the organiser keeps or stewards, the others share the rest. */
function suggestion(people: readonly DraftPerson[], duty: Duty): number {
  const you = people.findIndex((person) => person.you)
  if (duty === 'keeper') {
    const spectator = people.findIndex((person) => !person.listens)
    return spectator >= 0 ? spectator : Math.max(0, you)
  }
  if (duty === 'steward') {
    const organiser = people[you]
    return organiser && organiser.duty !== 'keeper' ? you : firstFree(people, (one) => one.duty !== 'keeper')
  }
  const other: Duty = duty === 'letters' ? 'codes' : 'letters'
  const notYou = firstFree(people, (one) => one.duty !== other && !one.you)
  return notYou >= 0 ? notYou : people.findIndex((one) => one.duty !== other)
}

/**
 * The same people for this way of tagging: duties that it does not know are laid down, those that nobody holds are
 * given to somebody, and whoever was chosen stays chosen.
 */
export function withDuties(people: readonly DraftPerson[], tagging: Tagging): DraftPerson[] {
  const wanted = dutiesFor(tagging)
  let shared = people.map((person): DraftPerson => {
    const duty = person.duty ?? 'none'
    const keeps = duty !== 'none' && wanted.includes(duty)
    return {
      ...person,
      duty: keeps ? duty : 'none',
      listens: duty === 'keeper' && !keeps ? true : person.listens,
    }
  })
  for (const duty of wanted) {
    const holder = holderOf(shared, duty)
    const taken = duty === 'steward' && tagging === 'keeper' && shared[holder]?.duty === 'keeper'
    if (holder < 0 || taken) shared = giveDuty(shared, duty, suggestion(shared, duty), tagging)
    else if (duty === 'keeper') shared = giveDuty(shared, duty, holder, tagging)
  }
  return shared
}
