import { QueryClientProvider, type QueryClient } from '@tanstack/react-query'
import type { ReactNode } from 'react'

interface ProvidersProps {
  client: QueryClient
  children: ReactNode
}

/** What every page stands on. */
export const Providers = ({ client, children }: ProvidersProps) => (
  <QueryClientProvider client={client}>{children}</QueryClientProvider>
)
