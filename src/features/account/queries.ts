import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useNavigate } from 'react-router-dom'
import {
  createAccount,
  createSession,
  endSession,
  getMe,
  renameAccount,
  type Me,
} from '#shared/contracts/account.ts'
import type { BodyOf } from '#shared/contracts/endpoint.ts'
import { to } from '#src/app/paths.ts'
import { keyOf } from '#src/lib/ask.ts'
import { call } from '#src/lib/call.ts'

/** What an earlier reader was shown is forgotten, then the new one is known. */
function useBecome(): (me: Me) => void {
  const client = useQueryClient()
  return (me) => {
    client.clear()
    client.setQueryData(keyOf(getMe), me)
  }
}

export function useSignIn() {
  const become = useBecome()
  return useMutation({
    mutationFn: (body: BodyOf<typeof createSession>) => call(createSession, { body }),
    onSuccess: become,
  })
}

export function useSignUp() {
  const become = useBecome()
  return useMutation({
    mutationFn: (body: BodyOf<typeof createAccount>) => call(createAccount, { body }),
    onSuccess: become,
  })
}

/** Ends the session, goes where anyone may be, and only then forgets what this person was shown. */
export function useSignOut() {
  const client = useQueryClient()
  const navigate = useNavigate()
  return useMutation({
    mutationFn: () => call(endSession),
    onSuccess: async () => {
      await navigate(to('home'))
      client.removeQueries({ type: 'inactive' })
      await client.resetQueries()
    },
  })
}

export function useRename(version: number) {
  const client = useQueryClient()
  return useMutation({
    mutationFn: (body: BodyOf<typeof renameAccount>) => call(renameAccount, { body, version }),
    onSuccess: (me) => client.setQueryData(keyOf(getMe), me),
  })
}
