import { createApp } from './app';
import { readConfig } from './config/read-config';
import { createContext } from './context';
import { migrate } from './db/migrate';
import { seedDemoIfEmpty } from './demo/seed-demo';
import { listen } from './listen';
import { openMailbox } from './mail/open-mailbox';

const config = readConfig(process.env);
const context = createContext(config, 'server');
migrate(context.db);
const mailbox = await openMailbox(context);
if (config.seedsDemo) await seedDemoIfEmpty(context);
const { server, url } = await listen(createApp(context), config.port, config.host);
context.log.info({ url }, 'listening');
process.send?.({ ready: url });

function stop(): void {
  server.close(() => {
    void mailbox?.close().finally(() => context.close());
  });
  server.closeIdleConnections();
}
process.once('SIGTERM', stop);
process.once('SIGINT', stop);
