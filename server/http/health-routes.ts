import { Router } from 'express';
import type { Context } from '../context';
import { jobsAreUp } from '../queue/worker-beat';

/** Whether the installation works, for a load balancer or a start script. */
export function healthRoutes(context: Context): Router {
  return Router().get('/health', (_request, response) => {
    response.json({ server: 'up', jobs: jobsAreUp(context) ? 'up' : 'down' });
  });
}
