/** In development the pages come from Angular's own server and everything below /api from ours. */
export default {
  '/api': { target: `http://127.0.0.1:${process.env.PORT ?? 3000}` },
};
