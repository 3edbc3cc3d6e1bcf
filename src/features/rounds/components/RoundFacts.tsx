import type { Round } from '#shared/contracts/rounds.ts'
import { sentenceCase } from '#src/lib/counts.ts'
import { blindingSentence, levelWords } from '../evening/plan-words.ts'
import { dutyWords } from '../evening/role-words.ts'
import { Facts } from './Facts.tsx'
import { ScorecardList } from './ScorecardList.tsx'

/** What the round is made of, as far as its reader may see it. */
export function RoundFacts({ round }: { round: Round }) {
  const list = (lines: string[]) =>
    lines.length > 0 && (
      <ul>
        {lines.map((line) => (
          <li key={line}>{line}</li>
        ))}
      </ul>
    )
  return (
    <Facts
      facts={[
        ['Question', <span className="font-serif">{round.question}</span>],
        [
          'Units',
          round.units
            ? list(round.units.map((unit) => `${unit.maker} ${unit.name}`))
            : `${round.unitCount}, under the cloth while you listen or steward`,
        ],
        ['People', list(round.people.map((person) => `${person.name} ${dutyWords(person.roles)}`)) || null],
        ['Blinding', blindingSentence[round.blinding]],
        ['Scorecard', <ScorecardList scorecard={round.scorecard} primary={round.primaryDescriptor} />],
        ['Music', list(round.tracks) || 'Not named'],
        ['Source', round.sourceChain],
        ['Levels', sentenceCase(levelWords[round.levelMatching])],
        ['Shape and cable', round.hiding],
        [
          'Published',
          round.publishesRows
            ? 'Ratings as a file, by listener number'
            : 'No rows, only what is computed from them',
        ],
      ].map(([term, answer]) => [term as string, answer] as const)}
    />
  )
}
