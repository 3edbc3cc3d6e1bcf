import type { ReactNode } from 'react'
import type { ResponseOf } from '#shared/contracts/endpoint.ts'
import type { getMailbox } from '#shared/contracts/account.ts'
import { moment } from '#src/lib/dates.ts'

type Message = ResponseOf<typeof getMailbox>['messages'][number]

const address = /(https?:\/\/[^\s<>]+[^\s<>.,;)])/

/** The text with its addresses as links; only http addresses become links. */
const linked = (text: string): ReactNode[] =>
  text.split(address).map((part, nth) =>
    nth % 2 === 1 ? (
      <a key={nth} href={part} className="break-all">
        {part}
      </a>
    ) : (
      part
    ),
  )

/** One message as it would have arrived. */
export function Letter({ message }: { message: Message }) {
  return (
    <li className="py-6">
      <article aria-labelledby={`letter-${message.id}`}>
        <h2 id={`letter-${message.id}`} className="heading">
          {message.subject}
        </h2>
        <p className="note">
          To {message.to} · {moment(message.receivedAt)}
        </p>
        <div className="reading mt-3 whitespace-pre-wrap">{linked(message.text)}</div>
      </article>
    </li>
  )
}
