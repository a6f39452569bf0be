import { listPeople } from '../accounts/list-people';
import type { Context } from '../context';
import { DEMO_DOMAIN } from './demo-sign-ins';

/**
 * Stops the start of production on a data folder that was filled with the demo: everybody in it, an administrator among
 * them, has the same public password.
 *
 * @throws Error naming the folder
 */
export function refuseDemoInProduction(context: Context): void {
  const { isProduction, dataDir } = context.config;
  if (!isProduction) return;
  const isDemo = listPeople(context).some(({ email, isDisabled }) => email.endsWith(`@${DEMO_DOMAIN}`) && !isDisabled);
  if (isDemo)
    throw new Error(
      `STRANDLINE_DATA_DIR: ${dataDir} holds the demo, whose passwords are public; name another, empty folder for production`,
    );
}
