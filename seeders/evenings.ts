import type { EveningDraftInput } from '#shared/contracts/evening-draft.ts'
import { shortScorecard } from '#shared/domain/lexicon.ts'
import { guests } from './people.ts'
import { sounds } from './sounds.ts'

/** The evenings of the demo as they were typed. All invented. */
type Person = EveningDraftInput['people'][number]

const units = (...names: string[]) => names.map((name) => ({ maker: sounds[name]?.maker ?? '', name }))
const listener = (name: string, more: Partial<Person> = {}): Person => ({ name, listens: true, ...more })
const listeners = (...names: string[]): Person[] => names.map((name) => listener(name))
const ines: Person = { name: 'Ines Falk', listens: false, you: true }
const tomas: Person = { name: 'Tomas Reyk', listens: false, duty: 'keeper' }
const wanda = listener('Wanda Osei', { steward: true })

const tracks = [
  'Harbour bells, second minute, for how far apart they stand',
  'Low Water, the verse, for the singer and the cello',
  'Brass on the Mole, the last chorus, loud and busy',
]
const chain = 'One player and one headphone amplifier for everybody, cable switched by the steward'
const sleeves = 'Black sleeves over the shells, the same dark cable on all'

export const threeForTheTrain: EveningDraftInput = {
  title: 'Three for the train',
  question: 'Which of three sounds most like the real thing?',
  units: units('Knot', 'Fairlead', 'Tern One'),
  people: [
    ines,
    tomas,
    listener('Maren Spit', { steward: true }),
    ...listeners('Jorun Keel', 'Dunya Reed', 'Hedda Buoy', 'Eskil Thorn', 'Kerensa Lugg'),
  ],
  scorecard: [...shortScorecard],
  primaryDescriptor: 'bass-amount',
  tracks: tracks.slice(0, 2),
  sourceChain: chain,
  levelMatching: 'by-ear',
  hiding: sleeves,
  tagging: 'keeper',
}

export const afterTheRegatta: EveningDraftInput = {
  title: 'After the regatta',
  question: 'Which one would we pass round?',
  units: units('Godwit', 'Whimbrel', 'Dunlin'),
  people: [
    { ...ines, duty: 'keeper', steward: true },
    ...listeners('Cosmo Vane', 'Fenna Gale', 'Lorcan Weir', 'Birte Quill'),
  ],
  scorecard: ['warmth', 'width'],
  tracks: tracks.slice(0, 1),
  levelMatching: 'not-matched',
  hiding: 'Eyes closed, handed over by the steward',
  tagging: 'single',
}

export const windInTheCables: EveningDraftInput = {
  title: 'Wind in the cables',
  question: 'Does any of four keep its bass with a loose tip?',
  units: units('Tern One', 'Capstan', 'Godwit', 'Avocet'),
  people: [ines, tomas, wanda, ...listeners('Aled Marsh', 'Fenna Gale', 'Ivo Tarn')],
  scorecard: ['deep-bass', 'bass-amount', 'warmth'],
  tracks: tracks.slice(0, 2),
  sourceChain: chain,
  levelMatching: 'measured',
  hiding: sleeves,
  tagging: 'keeper',
}

export const sixSmallOnes: EveningDraftInput = {
  title: 'Six small ones, one long evening',
  question: 'Which of six under 250 sets the sounds furthest apart?',
  units: units('Tern One', 'Dunlin', 'Whimbrel', 'Avocet', 'Knot', 'Godwit'),
  people: [ines, tomas, wanda, ...listeners(...Object.keys(guests))],
  scorecard: ['warmth', 'bass-amount', 'brightness', 'width', 'depth', 'natural-tone'],
  primaryDescriptor: 'width',
  tracks,
  sourceChain: chain,
  levelMatching: 'measured',
  hiding: sleeves,
  tagging: 'keeper',
}

export const fourAtTheWindow: EveningDraftInput = {
  title: 'Four at the window',
  question: 'Which of four is the brightest, and do we like it?',
  units: units('Tern One', 'Fairlead', 'Capstan', 'Avocet'),
  people: [
    { ...ines, listens: true },
    wanda,
    listener('Aled Marsh', { duty: 'letters' }),
    listener('Birte Quill', { duty: 'codes' }),
    ...listeners('Cosmo Vane', 'Hedda Buoy', 'Jorun Keel'),
  ],
  scorecard: ['warmth', 'brightness', 'bass-amount', 'layering'],
  primaryDescriptor: 'brightness',
  tracks,
  sourceChain: chain,
  levelMatching: 'measured',
  hiding: sleeves,
  tagging: 'split',
}

export const fiveTonight: EveningDraftInput = {
  title: 'Five on the table tonight',
  question: 'Which of five would we keep for voices?',
  units: units('Dunlin', 'Whimbrel', 'Knot', 'Capstan', 'Godwit'),
  people: [
    ines,
    tomas,
    wanda,
    ...listeners('Dunya Reed', 'Eskil Thorn', 'Fenna Gale', 'Kerensa Lugg', 'Lorcan Weir'),
  ],
  scorecard: ['voice-position', 'warmth', 'brightness', 'width', 'natural-tone'],
  tracks,
  sourceChain: chain,
  levelMatching: 'measured',
  hiding: sleeves,
  tagging: 'keeper',
}

export const nextSpring: EveningDraftInput = {
  title: 'Before the spring market',
  question: 'Which three go into the travel case?',
  units: units('Tern One', 'Dunlin', 'Knot', 'Fairlead', 'Capstan'),
  people: [
    ines,
    tomas,
    wanda,
    ...listeners('Cosmo Vane', 'Ivo Tarn', 'Jorun Keel', 'Maren Spit', 'Hedda Buoy'),
  ],
  scorecard: [...shortScorecard],
  tracks: tracks.slice(1),
  levelMatching: 'measured',
  hiding: sleeves,
  tagging: 'keeper',
}
