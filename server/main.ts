import { announce } from './announce';
import { createApp } from './app';
import { readConfig } from './config/read-config';
import { createContext } from './context';
import { migrate } from './db/migrate';
import { refuseDemoInProduction } from './demo/refuse-demo';
import { seedDemoIfEmpty } from './demo/seed-demo';
import { listen } from './listen';
import { openMailbox } from './mail/open-mailbox';
import { orExplain } from './or-explain';

await orExplain(async () => {
  const config = readConfig(process.env);
  const context = createContext(config, 'server');
  migrate(context.db);
  refuseDemoInProduction(context);
  const mailbox = await openMailbox(context);
  if (config.seedsDemo) await seedDemoIfEmpty(context);
  const { server, url } = await listen(createApp(context), config.port, config.host);
  announce(context, url);
  process.send?.({ ready: url });

  const stop = (): void => {
    server.close(() => {
      void Promise.resolve(mailbox?.close()).finally(() => context.close());
    });
    server.closeIdleConnections();
    if (process.connected) process.disconnect();
  };
  process.once('SIGTERM', stop);
  process.once('SIGINT', stop);
  // The start script has gone without saying so.
  process.once('disconnect', stop);
});
