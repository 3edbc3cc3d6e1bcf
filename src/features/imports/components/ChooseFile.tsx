import { useState } from 'react'
import { Button } from '#src/components/ui/Button.tsx'
import { Disclosure } from '#src/components/ui/Disclosure.tsx'
import { Field } from '#src/components/ui/Field.tsx'
import { TextArea } from '#src/components/ui/TextArea.tsx'
import { decodeText, refusedFile } from '../read-text.ts'

interface ChooseFileProps {
  error?: string | null
  /** The text, and what it should be called: the file's name, or "what you pasted". */
  onText: (text: string, source: string, encoding: string | null) => void
}

const example = `panelist,unit,descriptor,replicate,position,score
Ada,Dunlin,width,1,1,62
Ada,Knot,width,1,2,40
Bo,Dunlin,width,1,2,
Bo,Knot,width,1,1,41`

/** Choose a file or paste its text. The file is read in the browser; nothing is sent before it is shown. */
export function ChooseFile({ error, onText }: ChooseFileProps) {
  const [pasted, setPasted] = useState('')
  const [refused, setRefused] = useState<string | null>(null)
  const choose = async (file: File | undefined) => {
    if (!file) return
    const why = refusedFile(file)
    setRefused(why)
    if (why !== null) return
    const { text, encoding } = decodeText(new Uint8Array(await file.arrayBuffer()))
    onText(text, file.name, encoding)
  }
  return (
    <div className="fields">
      <Field
        id="text"
        label="Ratings file"
        hint="CSV, one row a rating: panelist, unit, descriptor, replicate, position, score. A blank score is missing. Commas, semicolons or tabs; decimal commas are read."
        error={refused ?? error}
      >
        {(wiring) => (
          <input
            {...wiring}
            type="file"
            accept=".csv,.tsv,.txt,text/csv,text/tab-separated-values,text/plain"
            className="entry"
            onChange={(event) => void choose(event.target.files?.[0])}
          />
        )}
      </Field>
      <Disclosure summary="Paste the rows instead">
        <TextArea
          id="pasted"
          label="Rows with their header"
          rows={8}
          value={pasted}
          onChange={(event) => setPasted(event.target.value)}
          spellCheck={false}
        />
        <div className="mt-3">
          <Button
            kind="secondary"
            onClick={() => onText(pasted, 'what you pasted', null)}
            disabledReason={pasted.trim() === '' ? 'Paste the rows first.' : null}
          >
            Read these rows
          </Button>
        </div>
      </Disclosure>
      <Disclosure summary="An example">
        <pre className="overflow-x-auto text-14">{example}</pre>
      </Disclosure>
    </div>
  )
}
