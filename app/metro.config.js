const http = require("node:http");
const { getDefaultConfig } = require("expo/metro-config");

/** @type {import("expo/metro-config").MetroConfig} */
const config = getDefaultConfig(__dirname);

// Development only: /api goes to Express, so the browser sees one origin and cookies work without CORS.
const apiPort = Number(process.env.API_PORT ?? 3000);

function forwardToApi(request, response) {
  const upstream = http.request(
    { host: "127.0.0.1", port: apiPort, method: request.method, path: request.url, headers: request.headers },
    (answer) => {
      response.writeHead(answer.statusCode ?? 502, answer.headers);
      answer.pipe(response);
    },
  );
  // 503 without problem details: the client tells it as "the server cannot be reached".
  upstream.on("error", () => {
    response.writeHead(503);
    response.end();
  });
  request.pipe(upstream);
}

config.server = {
  ...config.server,
  enhanceMiddleware: (metro) => (request, response, next) =>
    request.url?.startsWith("/api/") ? forwardToApi(request, response) : metro(request, response, next),
};

config.resolver.assetExts.push("woff2"); // not among the defaults

// zod re-exports all its locales and Metro does not shake trees: keep English only, half the size.
const upstreamResolve = config.resolver.resolveRequest;
config.resolver.resolveRequest = (context, name, platform) => {
  const resolve = upstreamResolve ?? context.resolveRequest;
  const isZodLocales =
    /locales\/index\.c?js$/.test(name) && /[\\/]zod[\\/]v4[\\/]/.test(context.originModulePath);
  return resolve(context, isZodLocales ? name.replace("index.", "en.") : name, platform);
};

module.exports = config;
