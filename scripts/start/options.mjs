import { parseArgs } from 'node:util'

export const usage = `npm start [-- options]
  (none)      the demo: invented data in a database of its own, on this machine only
  --live      your own data: another database, nothing invented, no demo pages
  --lan       listen on the local network too, for the phones of those present
  --port N    the port to listen on (4600, or the next that is free)
  --dev       rebuild as you edit (npm run dev)`

/**
 * @param {string[]} args
 * @param {NodeJS.ProcessEnv} [env] PORT is taken when --port is not given
 * @returns {{ mode: 'demo' | 'live', lan: boolean, dev: boolean, help: boolean, port: number }}
 * @throws {RangeError} for an option or a port that there is not
 */
export function parseOptions(args, env = {}) {
  let values
  try {
    values = parseArgs({
      args,
      options: {
        live: { type: 'boolean', default: false },
        lan: { type: 'boolean', default: false },
        dev: { type: 'boolean', default: false },
        help: { type: 'boolean', short: 'h', default: false },
        port: { type: 'string' },
      },
    }).values
  } catch (error) {
    throw new RangeError(`${error.message}\n\n${usage}`)
  }
  const port = Number(values.port ?? env.PORT ?? 4600)
  if (!Number.isInteger(port) || port < 1 || port > 65_535) {
    throw new RangeError(`A port is a whole number from 1 to 65535, not “${values.port ?? env.PORT}”.`)
  }
  const { live, lan, dev, help } = values
  return { mode: live ? 'live' : 'demo', lan: !!lan, dev: !!dev, help: !!help, port }
}
