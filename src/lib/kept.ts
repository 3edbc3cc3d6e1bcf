/** What this tab keeps over a reload. A browser that refuses storage keeps nothing, and nothing else breaks. */
export interface Kept<T> {
  read(): T | undefined
  write(value: T): void
  forget(): void
}

export function kept<T>(name: string, storage: () => Storage = () => window.sessionStorage): Kept<T> {
  const key = `scrim.${name}`
  const attempt = <R>(work: () => R): R | undefined => {
    try {
      return work()
    } catch {
      return undefined
    }
  }
  return {
    read: () =>
      attempt(() => {
        const text = storage().getItem(key)
        return text === null ? undefined : (JSON.parse(text) as T)
      }),
    write: (value) => {
      attempt(() => storage().setItem(key, JSON.stringify(value)))
    },
    forget: () => {
      attempt(() => storage().removeItem(key))
    },
  }
}
