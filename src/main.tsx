import { StrictMode } from 'react'
import { createRoot } from 'react-dom/client'
import { RouterProvider } from 'react-router-dom'
import { Providers } from '#src/app/providers.tsx'
import { router } from '#src/app/router.tsx'
import { createQueryClient } from '#src/lib/query-client.ts'
import './styles/index.css'

const root = document.getElementById('root')
if (!root) throw new Error('The page has no #root to draw into.')

createRoot(root).render(
  <StrictMode>
    <Providers client={createQueryClient()}>
      <RouterProvider router={router} />
    </Providers>
  </StrictMode>,
)
