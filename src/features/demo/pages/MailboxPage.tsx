import { useQuery } from '@tanstack/react-query'
import { Asked } from '#src/components/asked/Asked.tsx'
import { Folio, FolioSection } from '#src/components/layout/Folio.tsx'
import { Empty } from '#src/components/ui/Empty.tsx'
import { PageTitle } from '#src/components/ui/PageTitle.tsx'
import { Letter } from '../components/Letter.tsx'
import { mailboxQuery } from '../queries.ts'

export default function MailboxPage() {
  const query = useQuery({ ...mailboxQuery, refetchInterval: 5_000 })
  return (
    <Folio>
      <FolioSection
        label="Demo"
        note={
          <p>
            In the demo Scrim’s mail goes to a mail server of its own that hands it on to this page. None of
            it leaves this machine.
          </p>
        }
      >
        <PageTitle>Mailbox</PageTitle>
        <Asked query={query} waiting="Reading the mailbox">
          {({ messages }) =>
            messages.length === 0 ? (
              <div className="mt-6">
                <Empty
                  what="Mail that Scrim sends in this demo lies here."
                  sentence="Ask for a new password, or open a round, and a message arrives."
                />
              </div>
            ) : (
              <ul className="rows mt-4">
                {messages.map((message) => (
                  <Letter key={message.id} message={message} />
                ))}
              </ul>
            )
          }
        </Asked>
      </FolioSection>
    </Folio>
  )
}
