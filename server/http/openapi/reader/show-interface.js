/* A file of its own, because the content policy allows no script inside the page. */
globalThis.SwaggerUIBundle({
  url: '/api/openapi.json',
  dom_id: '#interface',
  // Would send the document to a server on the network.
  validatorUrl: null,
  requestInterceptor: (request) => {
    const token = /(?:^|; )XSRF-TOKEN=([^;]+)/.exec(globalThis.document.cookie)?.[1];
    if (token !== undefined) request.headers['X-XSRF-TOKEN'] = decodeURIComponent(token);
    return request;
  },
});
