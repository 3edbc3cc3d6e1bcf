interface Listener {
  /** Something changed; what exactly is for the caller to ask. */
  changed(): void
  /** Whether events arrive. While they do not, the caller asks by the clock. */
  connected(now: boolean): void
}

const reopenAfter = 15_000

/** Follows a stream of server-sent events until the returned function is called; reopens one that was refused. */
export function follow(address: string, { changed, connected }: Listener): () => void {
  if (typeof EventSource === 'undefined') {
    connected(false)
    return () => undefined
  }
  let source: EventSource
  let timer: ReturnType<typeof setTimeout> | undefined
  const open = () => {
    source = new EventSource(address)
    source.onopen = () => {
      connected(true)
      changed()
    }
    source.onmessage = changed
    source.addEventListener('changed', changed)
    source.onerror = () => {
      connected(false)
      if (source.readyState === EventSource.CLOSED) timer = setTimeout(open, reopenAfter)
    }
  }
  open()
  return () => {
    clearTimeout(timer)
    source.close()
  }
}
