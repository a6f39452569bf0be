import * as z from 'zod';

// zod tries whether it may compile its checks; the content policy forbids that and would report it as a violation. Import
// this before any contract whose schema a page uses; test/architecture/zod-in-pages.spec.ts keeps it so.
z.config({ jitless: true });
