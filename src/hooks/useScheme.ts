import { useCallback, useSyncExternalStore } from 'react'

export type Scheme = 'system' | 'light' | 'dusk'

/** Also read by public/scheme.js before the first paint. */
const KEY = 'scrim-scheme'
const listeners = new Set<() => void>()

function stored(): Scheme {
  try {
    const value = localStorage.getItem(KEY)
    return value === 'light' || value === 'dusk' ? value : 'system'
  } catch {
    return 'system'
  }
}

function apply(scheme: Scheme) {
  if (scheme === 'system') delete document.documentElement.dataset.scheme
  else document.documentElement.dataset.scheme = scheme
}

function subscribe(listener: () => void) {
  const fromOtherTab = (event: StorageEvent) => {
    if (event.key !== KEY) return
    apply(stored())
    listener()
  }
  listeners.add(listener)
  window.addEventListener('storage', fromOtherTab)
  return () => {
    listeners.delete(listener)
    window.removeEventListener('storage', fromOtherTab)
  }
}

/** The chosen scheme (light, dusk, or as the system says) and the way to choose it; kept on this device. */
export function useScheme(): [Scheme, (scheme: Scheme) => void] {
  const scheme = useSyncExternalStore(subscribe, stored, () => 'system' as const)
  const choose = useCallback((next: Scheme) => {
    try {
      if (next === 'system') localStorage.removeItem(KEY)
      else localStorage.setItem(KEY, next)
    } catch {
      // Storage may be refused; the choice then lasts as long as the page.
    }
    apply(next)
    for (const listener of listeners) listener()
  }, [])
  return [scheme, choose]
}
