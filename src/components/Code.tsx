import { Cloth } from './Cloth.tsx'
import { VisuallyHidden } from './ui/VisuallyHidden.tsx'

interface CodeProps {
  /** Three digits ("417"), or a letter of a split key. Null shows the cloth alone: the code is not known here. */
  code: string | null
  /** small 40 px high, medium 60, steward 80 (40 px digits), keeper 144 (72 px digits). */
  size?: 'small' | 'medium' | 'steward' | 'keeper'
  /** Draws the cloth aside: the key is open. */
  drawn?: boolean
  /** What the swatch is called by a screen reader; the digits follow. */
  label?: string
}

/** A code is a woven swatch, its digits tabular and bold on a bare patch. */
export function Code({ code, size = 'medium', drawn = false, label }: CodeProps) {
  return (
    <span className="code" data-size={size}>
      <Cloth drawn={drawn} tile={size === 'small' ? 6 : 8} />
      {code === null ? (
        <VisuallyHidden>{label ?? 'masked'}</VisuallyHidden>
      ) : (
        <>
          {label && <VisuallyHidden>{label} </VisuallyHidden>}
          <span className="code-digits">{code}</span>
        </>
      )}
    </span>
  )
}
