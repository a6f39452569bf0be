import { Strategy } from 'passport-local';
import type { Context } from '../context';
import { isPassword } from './password-hash';
import { findPersonByEmail } from './person-store';

/** Checks e-mail and password; unknown, disabled and mistyped end alike and take alike. */
export function signInStrategy(context: Context): Strategy {
  return new Strategy({ usernameField: 'email' }, (email, password, done) => {
    const person = findPersonByEmail(context.db, email);
    isPassword(password, person?.passwordHash).then(
      (isMatch) => {
        const isAdmitted = isMatch && person !== undefined && person.disabledAt === null;
        done(null, isAdmitted ? { personId: person.id } : false);
      },
      (error: unknown) => done(error),
    );
  });
}
