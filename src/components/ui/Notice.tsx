import type { ReactNode } from 'react'
import { Icon } from '../Icon.tsx'

interface NoticeProps {
  /** signal: something needs attention. done: something is finished. plain: good to know. */
  kind?: 'signal' | 'done' | 'plain'
  title?: ReactNode
  children?: ReactNode
  /** Announced when it appears; leave off for words that were always there. */
  live?: boolean
}

/** A word from Scrim, without a box: its sign, a few words in bold, a sentence. */
export function Notice({ kind = 'plain', title, children, live = false }: NoticeProps) {
  const sign = { signal: 'alert', done: 'check', plain: 'note' } as const
  return (
    <div
      className="notice"
      data-kind={kind}
      role={live ? (kind === 'signal' ? 'alert' : 'status') : undefined}
    >
      <Icon name={sign[kind]} />
      <div>
        {title && <p className="notice-title">{title}</p>}
        {children && <div>{children}</div>}
      </div>
    </div>
  )
}
