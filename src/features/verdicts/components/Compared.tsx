import type { PublicVerdict } from '#shared/contracts/verdicts.ts'
import { FolioSection } from '#src/components/layout/Folio.tsx'
import { asPoints } from '#src/components/results/figures.ts'
import { DataTable } from '#src/components/ui/DataTable.tsx'
import { day } from '#src/lib/dates.ts'
import { provenanceWords } from '../disclosure-wording.ts'
import { asMoney } from '../money.ts'

type Unit = PublicVerdict['units'][number]

const priceWords = (unit: Unit, withDay: boolean): string => {
  if (unit.price === null) return unit.priceUnknown ? 'no price' : '–'
  return withDay ? `${asMoney(unit.price)}, ${day(unit.price.on, 'UTC')}` : asMoney(unit.price)
}

/** The one day on which all prices held; null where they differ. */
function commonDay(units: readonly Unit[]): string | null {
  const days = new Set(units.flatMap((unit) => (unit.price === null ? [] : [unit.price.on])))
  const [first = null] = days
  return days.size === 1 ? first : null
}

/** A photograph whole on paper, at most 320 px high. */
function Photo({ unit }: { unit: Unit }) {
  if (unit.photo === null) return null
  return (
    <figure className="keep-together">
      <img
        src={unit.photo.url}
        width={unit.photo.width}
        height={unit.photo.height}
        alt={`${unit.maker} ${unit.name}`}
        loading="lazy"
        className="h-auto max-h-80 w-auto max-w-full object-contain"
      />
      <figcaption className="note mt-1">
        {unit.maker} {unit.name}
      </figcaption>
    </figure>
  )
}

interface ComparedProps {
  units: Unit[]
  disclosures: string[]
  results: PublicVerdict['results']
  /** Where "All disclosures" leads. */
  anchor?: string
}

/** What was set against what: maker, how the panel got it, price with its day, liking where it was asked. */
export function Compared({ units, disclosures, results, anchor = 'compared' }: ComparedProps) {
  const liking = results.find((result) => result.descriptor.family === 'liking')
  const priced = commonDay(units)
  const photos = units.filter((unit) => unit.photo !== null)
  return (
    <FolioSection
      label="Compared"
      note={liking ? 'Liking is what these listeners liked. It predicts nobody else’s.' : undefined}
    >
      <div id={anchor}>
        <h2 className="heading mb-3">What was compared</h2>
        <DataTable
          caption="Units in this round"
          captionHidden
          rows={units}
          rowKey={(unit) => unit.id}
          columns={[
            { key: 'name', header: 'Unit', cell: (unit) => unit.name },
            ...(units.some((unit) => unit.maker !== '')
              ? [{ key: 'maker', header: 'Maker', cell: (unit: Unit) => unit.maker }]
              : []),
            {
              key: 'provenance',
              header: 'How we got it',
              cell: (unit) => (unit.provenance === null ? 'not said' : provenanceWords[unit.provenance].word),
            },
            {
              key: 'price',
              header: priced ? `Price, ${day(priced, 'UTC')}` : 'Price and its day',
              numeric: true,
              cell: (unit) => priceWords(unit, priced === null),
            },
            ...(liking
              ? [
                  {
                    key: 'liked',
                    header: 'Liked, median',
                    numeric: true,
                    cell: (unit: Unit) => {
                      const found = liking.units.find((one) => one.unit === unit.name)
                      return asPoints(found?.median ?? null, liking.descriptor.scale)
                    },
                  },
                ]
              : []),
          ]}
        />
        <h3 className="subheading mt-6">Disclosures</h3>
        <ul className="reading mt-2">
          {disclosures.map((line) => (
            <li key={line}>{line}</li>
          ))}
        </ul>
        {photos.length > 0 && (
          <div className="mt-6 flex flex-wrap items-end gap-6">
            {photos.map((unit) => (
              <Photo key={unit.id} unit={unit} />
            ))}
          </div>
        )}
      </div>
    </FolioSection>
  )
}
