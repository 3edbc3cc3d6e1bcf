import { hash, verify } from '@node-rs/argon2'

/** argon2id with the parameters of RFC 9106's second recommendation scaled to a small server: 19 MiB, two passes. */
const cost = { memoryCost: 19_456, timeCost: 2, parallelism: 1 }

export const hashPassword = (password: string): Promise<string> => hash(password.normalize('NFKC'), cost)

/** False for a wrong password and for a hash that cannot be read. */
export async function passwordMatches(stored: string, password: string): Promise<boolean> {
  try {
    return await verify(stored, password.normalize('NFKC'))
  } catch {
    return false
  }
}

let decoy: Promise<string> | undefined
/** Takes as long as a real check, so that an unknown address answers no faster than a wrong password. */
export async function wastePasswordCheck(password: string): Promise<void> {
  decoy ??= hashPassword('nobody has this password')
  await passwordMatches(await decoy, password)
}
