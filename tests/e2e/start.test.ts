import { createServer, type AddressInfo } from 'node:net'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createAccount, createSession, getMailbox, getMe } from '#shared/contracts/account.ts'
import { allGone, copyBuiltProject, killAll, type ProjectCopy } from '#tests/support/started-project.ts'
import { visit } from '#tests/support/visitor.ts'

let copy: ProjectCopy

beforeAll(() => {
  copy = copyBuiltProject()
})
afterAll(async () => {
  killAll(copy)
  await allGone(copy)
  copy.remove()
})

const ruta = { email: 'ruta@example.org', password: 'a boat in the fog' }

describe('npm start', () => {
  it('prints the address first and the demo’s sign-ins, and they work', async () => {
    const started = await copy.start()
    expect(started.printed()).toMatch(/ines@example\.org +harbour at dusk/)
    const visitor = visit(started.address)
    expect(await visitor.call(getMe)).toMatchObject({ user: null, mode: 'demo' })
    await visitor.call(createSession, { body: { email: 'ines@example.org', password: 'harbour at dusk' } })
    const newcomer = { ...ruta, name: 'Ruta Vint', panelName: 'North Pier', timeZone: 'UTC' }
    await visit(started.address).call(createAccount, { body: newcomer })
    const page = await visitor.fetch('/sign-in', { headers: { Accept: 'text/html' } })
    expect(page.status).toBe(200)
    expect(await page.text()).toMatch(/<div id="root">/)
  })

  it('starts with all data after everything was killed without notice', async () => {
    killAll(copy)
    await allGone(copy)
    const { address } = await copy.start()
    const { user } = await visit(address).call(createSession, { body: ruta })
    expect(user).toMatchObject({ name: 'Ruta Vint' })
  })

  it('takes another port when the one asked for is taken, and a second start joins the same database', async () => {
    const holder = createServer()
    await new Promise<void>((resolve) => holder.listen(0, '127.0.0.1', resolve))
    const { port } = holder.address() as AddressInfo
    const second = await copy.start('--port', String(port))
    expect(second.printed()).toContain(`Port ${port} is taken`)
    expect((await visit(second.address).call(createSession, { body: ruta })).user).not.toBeNull()
    await new Promise((resolve) => holder.close(resolve))
  })

  it('with --live shows nothing of the demo, and prints the first organiser’s address', async () => {
    const live = await copy.start('--live')
    const visitor = visit(live.address)
    expect(await visitor.call(getMe)).toMatchObject({ mode: 'live' })
    await expect(visitor.call(createSession, { body: ruta })).rejects.toThrow()
    await expect(visitor.call(getMailbox)).rejects.toMatchObject({ code: 'not_found' })
    expect(live.printed()).not.toContain('harbour at dusk')
    expect(live.printed()).toMatch(/sign-up\?first=\S+/)
  })

  it('leaves nothing running when each npm is told to end', async () => {
    killAll(copy)
    await allGone(copy)
    const first = await copy.start()
    const second = await copy.start('--live')
    first.npm.kill('SIGTERM')
    await new Promise((resolve) => first.npm.once('exit', resolve))
    expect((await visit(second.address).call(getMe)).mode).toBe('live')
    second.npm.kill('SIGTERM')
    await allGone(copy)
    expect(copy.processes()).toEqual([])
  })
})
