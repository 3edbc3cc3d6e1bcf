import { useNavigation } from 'react-router-dom'
import { Waiting } from '#src/components/ui/Waiting.tsx'

/** A thread along the top while a page that was not opened before is on its way. */
export function Arriving() {
  const { state } = useNavigation()
  return state === 'loading' ? (
    <div className="fixed inset-x-0 top-0 z-40">
      <Waiting label="Opening the page" />
    </div>
  ) : null
}

/** What stands on the first load until the page's own part of the program is here. */
export const FirstLoad = () => <Waiting label="Opening Scrim" />
