import { useRef, useState } from 'react'
import { Button } from './Button.tsx'

interface CopyLineProps {
  /** What the line is: "Link for seat 3", "Fingerprint of the key". */
  label: string
  value: string
}

/**
 * A line to hand on: an address, a fingerprint. Where the browser gives no clipboard (a page over plain http beyond this
 * machine) the line is selected instead, and the button says so.
 */
export function CopyLine({ label, value }: CopyLineProps) {
  const line = useRef<HTMLSpanElement>(null)
  const [said, setSaid] = useState('')
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(value)
      setSaid('Copied')
    } catch {
      const range = document.createRange()
      if (line.current) range.selectNodeContents(line.current)
      const selection = window.getSelection()
      selection?.removeAllRanges()
      selection?.addRange(range)
      setSaid('Selected: copy it by hand')
    }
  }
  return (
    <div>
      <div className="field-label text-14">{label}</div>
      <div className="copy-line">
        <span ref={line} className="copy-line-value">
          {value}
        </span>
        <Button kind="secondary" icon="copy" onClick={copy} aria-label={`Copy: ${label}`}>
          Copy
        </Button>
      </div>
      <p role="status" className="note">
        {said}
      </p>
    </div>
  )
}
