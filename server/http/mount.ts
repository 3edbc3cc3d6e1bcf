import { createHash } from 'node:crypto'
import express, { type Request, type RequestHandler, type Response, type Router } from 'express'
import type { z } from 'zod'
import type { Endpoint } from '#shared/contracts/endpoint.ts'
import { limits } from '#shared/domain/limits.ts'
import { inTransaction } from '../db/transaction.ts'
import type { Deps } from '../deps.ts'
import { ApiError } from './api-error.ts'
import type { Context } from './context.ts'
import { takePhoto } from '../uploads/photo.ts'
import { actorOf, sessionHandle } from './current-session.ts'
import { answeredBefore, keepAnswer } from './idempotency.ts'
import { readAnswer, readInput } from './parse.ts'

export type Handler<E extends Endpoint> = (
  input: { params: z.output<E['params']>; query: z.output<E['query']>; body: z.output<E['body']> },
  context: Context,
) => Promise<z.input<E['response']>>

export type Mount = <E extends Endpoint>(endpoint: E, handler: Handler<E>) => void

/** What a file endpoint answers with. */
export interface FileAnswer {
  mediaType: string
  bytes: Buffer | string
  /** Offered as a download under this name. */
  name?: string
  /** Never changes under this address. */
  immutable?: boolean
}

/** Thrown by `context.refuse`: the transaction commits, then the error is answered. */
class Refusal extends Error {
  readonly error: ApiError
  constructor(error: ApiError) {
    super(error.message)
    this.error = error
  }
}

/** Reads `If-Match: "7"`. */
function editedVersion(endpoint: Endpoint, request: Request): number | undefined {
  if (!endpoint.versioned) return undefined
  const version = Number(request.get('if-match')?.replaceAll('"', ''))
  if (!Number.isInteger(version))
    throw new ApiError('malformed', 'An edit must say which version it was made from (If-Match).')
  return version
}

export function contextOf(
  deps: Deps,
  endpoint: Endpoint,
  request: Request,
  response: Response,
): Context & { committed(): void } {
  const waiting: (() => void)[] = []
  const key = request.get('idempotency-key')
  if (key !== undefined && !/^[\w-]{8,100}$/.test(key))
    throw new ApiError('malformed', 'The Idempotency-Key must be 8 to 100 letters, digits or hyphens.')
  return {
    deps,
    now: deps.clock.now(),
    actor: actorOf(request),
    session: sessionHandle(request, response),
    requestId: String(request.id),
    idempotencyKey: key,
    version: editedVersion(endpoint, request),
    panelId: undefined,
    afterCommit: (work) => void waiting.push(work),
    refuse: (error) => {
      throw new Refusal(error)
    },
    request,
    committed: () => waiting.forEach((work) => work()),
  }
}

/**
 * The one straight line of a request: session → actor → rate limit → same origin (both before this) → contract →
 * transaction → service → contract again → JSON.
 */
export function mounter(router: Router, deps: Deps): Mount {
  return (endpoint, handler) => {
    const method = endpoint.method.toLowerCase() as 'get'
    const before: RequestHandler[] = []
    if (endpoint.audience === 'signed-in' || endpoint.audience === 'panel')
      before.push(signedIn(endpoint.audience))
    if (endpoint.kind === 'json' && endpoint.method !== 'GET')
      before.push(express.json({ limit: endpoint.bodyLimit ?? limits.jsonBytes, strict: true }))
    if (endpoint.kind === 'upload') before.push(takePhoto)
    router[method](endpoint.path, ...before, async (request: Request, response: Response) => {
      const context = contextOf(deps, endpoint, request, response)
      const input = readInput(endpoint, request)
      const repeated = endpoint.idempotent && context.idempotencyKey !== undefined
      const digest = repeated
        ? createHash('sha256')
            .update(JSON.stringify([input.params, input.body]))
            .digest('hex')
        : ''
      const answer = await inTransaction(deps.sequelize, { userId: context.actor.userId }, async () => {
        const before = repeated ? await answeredBefore(context, endpoint.id, digest) : undefined
        if (before !== undefined) return before
        const made = await handler(input as never, context).catch((error: unknown) => {
          if (error instanceof Refusal) return error
          throw error
        })
        if (made instanceof Refusal) return made
        if (endpoint.kind === 'file') return made
        const read = readAnswer(endpoint, made, !deps.env.production, (message) => deps.log.error(message))
        if (repeated) await keepAnswer(context, endpoint.id, digest, read)
        return read
      })
      context.committed()
      if (answer instanceof Refusal) throw answer.error
      if (endpoint.kind === 'file') sendFile(response, answer as FileAnswer)
      else response.set('Cache-Control', 'no-store').json(answer)
    })
  }
}

const signedIn =
  (audience: string): RequestHandler =>
  (request, _response, next) =>
    next(
      request.user
        ? undefined
        : new ApiError(
            'not_signed_in',
            audience === 'panel' ? 'Sign in to see this panel.' : 'Sign in first.',
          ),
    )

function sendFile(response: Response, file: FileAnswer): void {
  response.set('Content-Type', file.mediaType)
  response.set('Cache-Control', file.immutable ? 'public, max-age=31536000, immutable' : 'no-cache')
  response.set('Content-Security-Policy', "default-src 'none'; sandbox")
  if (file.name) response.set('Content-Disposition', `attachment; filename="${file.name}"`)
  response.send(typeof file.bytes === 'string' ? Buffer.from(file.bytes, 'utf8') : file.bytes)
}
