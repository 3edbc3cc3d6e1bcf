/** First link of each page: past the top line to what the page is about. The layout's main carries the id. */
export function SkipLink({ to = 'matter' }: { to?: string }) {
  return (
    <a className="skip-link visually-hidden" href={`#${to}`}>
      Skip to the matter
    </a>
  )
}
