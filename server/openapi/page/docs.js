/** Shows the description, and lets it be tried out in the session of whoever reads it. */
window.SwaggerUIBundle({
  url: '/api/openapi.json',
  dom_id: '#description',
  deepLinking: true,
  requestInterceptor: (request) => {
    const token = /(?:^|; )XSRF-TOKEN=([^;]+)/.exec(document.cookie)?.[1];
    if (token) request.headers['X-XSRF-TOKEN'] = decodeURIComponent(token);
    return request;
  },
});
