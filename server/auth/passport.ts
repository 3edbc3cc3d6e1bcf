import passport from 'passport'
import { Strategy } from 'passport-local'
import type { SignedIn } from '../http/current-session.ts'
import { User } from '../models/user.ts'
import { passwordMatches, wastePasswordCheck } from './passwords.ts'

/** Sign-in by address and password. The session keeps the user's id and nothing else. */
export function setUpPassport(): void {
  passport.use(
    new Strategy({ usernameField: 'email', passwordField: 'password' }, (email, password, done) => {
      const check = async (): Promise<SignedIn | false> => {
        const user = await User.findOne({ where: { email: email.trim().toLowerCase() } })
        if (!user) {
          await wastePasswordCheck(password)
          return false
        }
        return (await passwordMatches(user.passwordHash, password)) ? { id: user.id } : false
      }
      check().then((user) => done(null, user), done)
    }),
  )
  passport.serializeUser((user, done) => done(null, (user as SignedIn).id))
  passport.deserializeUser((id: string, done) => done(null, { id }))
}
