import { useEffect } from 'react'

/** Names the document: "Rounds · Scrim". Give the page's own words only. */
export function useTitle(title: string) {
  useEffect(() => {
    document.title = title === 'Scrim' ? title : `${title} · Scrim`
  }, [title])
}
