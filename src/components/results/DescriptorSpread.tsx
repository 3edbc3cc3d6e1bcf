import type { DescriptorResult } from '#shared/contracts/analysis.ts'
import { HeardLine } from '../charts/HeardLine.tsx'
import { Threads } from '../charts/Threads.tsx'
import { FamilyName } from '../FamilySign.tsx'
import { FolioSection } from '../layout/Folio.tsx'
import { Disclosure } from '../ui/Disclosure.tsx'
import { statedWords } from './agreement-words.ts'
import { AgreementNote } from './AgreementNote.tsx'
import { heardRows, heardScale, listenersOf, threadUnits } from './chart-input.ts'
import { decimalsFor } from './figures.ts'
import { ModelNumbers } from './ModelNumbers.tsx'

interface DescriptorSpreadProps {
  result: DescriptorResult
  /** What a listener is called: a number in public, a name for the organiser. */
  listenerName?: (listener: string) => string
}

/** One descriptor a spread: heard line, the sentence, threads, the model; agreement in the margin. */
export function DescriptorSpread({ result, listenerName }: DescriptorSpreadProps) {
  const { descriptor } = result
  const listeners = listenersOf(result)
  const scale = heardScale(descriptor)
  const decimals = decimalsFor(descriptor.scale)
  const units = threadUnits(result, listeners)
  const called = listenerName ?? ((listener: string) => `Listener ${listener}`)
  return (
    <FolioSection
      label={<FamilyName family={descriptor.family} />}
      note={<AgreementNote result={result} />}
      name={descriptor.name}
    >
      <div id={`descriptor-${descriptor.key}`}>
        <h2 className="heading">{descriptor.name}</h2>
        <p className="text-muted">{descriptor.sentence}</p>
        <HeardLine
          bare
          title={`${descriptor.name}, heard line`}
          sentence={descriptor.sentence}
          family={descriptor.family}
          scale={scale}
          rows={heardRows(result)}
          decimals={decimals}
        />
        <p className="reading mt-3">{result.sentence}</p>
        <p className="note mt-1">{statedWords[result.stated]}</p>
        {units.length > 1 && (
          <Threads
            bare
            title={`${descriptor.name}, threads`}
            sentence="Each thin line is one listener, the bold one the panel."
            family={descriptor.family}
            scale={scale}
            units={units}
            listeners={listeners.map(called)}
            decimals={decimals}
          />
        )}
        <Disclosure summary="The model and every pair">
          <ModelNumbers result={result} />
        </Disclosure>
      </div>
    </FolioSection>
  )
}
