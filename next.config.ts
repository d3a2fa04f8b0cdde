import { createRequire } from "node:module";
import withSerwistInit from "@serwist/next";
import { type NextConfig } from "next";

const require = createRequire(import.meta.url);
const { NormalModuleReplacementPlugin, DefinePlugin } = require("next/dist/compiled/webpack/webpack-lib") as {
  NormalModuleReplacementPlugin: new (
    test: RegExp,
    change: (resource: { request: string }) => void,
  ) => object;
  DefinePlugin: new (values: Record<string, string>) => object;
};

/** One build's name: the service worker keeps the answers of one build together by it. */
const buildId = process.env.NOTCHBOOK_BUILD_ID ?? Date.now().toString(36);
process.env.NOTCHBOOK_BUILD_ID = buildId;

const forEver = { key: "Cache-Control", value: "public, max-age=31536000, immutable" };

const isBuilt = process.env.NODE_ENV === "production";
const builtFiles = "/_next/static/:path*.:ext(js|css)";
const readsBrotli = { type: "header" as const, key: "accept-encoding", value: ".*\\bbr\\b.*" };

const config: NextConfig = {
  reactStrictMode: true,
  poweredByHeader: false,
  generateBuildId: () => buildId,
  serverExternalPackages: ["@electric-sql/pglite"],
  experimental: { optimizePackageImports: ["lucide-react", "radix-ui"] },
  headers: async () => [
    {
      source: "/:path*",
      headers: [
        { key: "X-Content-Type-Options", value: "nosniff" },
        { key: "Referrer-Policy", value: "same-origin" },
        { key: "X-Frame-Options", value: "DENY" },
        { key: "Permissions-Policy", value: "camera=(self), microphone=(), geolocation=()" },
        { key: "X-Notchbook-Build", value: buildId },
      ],
    },
    // Compressed once when the app is built; their names carry the hash of what is in them.
    {
      source: "/pglite/:name*.br",
      headers: [
        { key: "Content-Encoding", value: "br" },
        { key: "Content-Type", value: "application/octet-stream" },
        forEver,
      ],
    },
    ...(isBuilt
      ? [
          {
            source: builtFiles,
            has: [readsBrotli],
            headers: [
              { key: "Content-Encoding", value: "br" },
              { key: "Vary", value: "Accept-Encoding" },
              forEver,
            ],
          },
        ]
      : []),
    { source: "/sw.js", headers: [{ key: "Cache-Control", value: "no-cache" }] },
  ],
  // Compressed by `db/compress-static.mjs` after the build.
  rewrites: async () => ({
    beforeFiles: isBuilt
      ? [{ source: builtFiles, has: [readsBrotli], destination: "/static-br/:path*.:ext" }]
      : [],
    afterFiles: [],
    fallback: [],
  }),
  webpack: (webpackConfig, { isServer }) => {
    if (!isServer) {
      // PGlite names Node's modules in paths that a browser never takes.
      webpackConfig.plugins.push(
        new NormalModuleReplacementPlugin(/^node:/, (resource) => {
          resource.request = resource.request.replace(/^node:/, "");
        }),
      );
      // What jsPDF would fetch for turning web pages into PDF; nothing here does.
      webpackConfig.resolve.alias = {
        ...webpackConfig.resolve.alias,
        html2canvas: false,
        canvg: false,
        dompurify: false,
      };
      webpackConfig.resolve.fallback = {
        ...webpackConfig.resolve.fallback,
        fs: false,
        path: false,
        url: false,
        crypto: false,
        module: false,
        util: false,
        "fs/promises": false,
      };
    }
    webpackConfig.plugins.push(
      new DefinePlugin({ "process.env.NOTCHBOOK_BUILD_ID": JSON.stringify(buildId) }),
    );
    return webpackConfig;
  },
};

const withSerwist = withSerwistInit({
  swSrc: "worker/sw.ts",
  swDest: "public/sw.js",
  register: false,
  disable: process.env.NODE_ENV === "development",
  // The bundler's own copies of PGlite's files are never fetched: `db/browser/open.ts` hands over compressed ones.
  exclude: [
    // For browsers without modules, and for the pages router: never asked for.
    /chunks\/(polyfills|framework|main)-[0-9a-f]+\.js$/,
    /chunks\/pages\//,
    /\.map$/,
    /\.(wasm|data)$/,
    /\.tar\.gz$/,
    /^\/?_next\/server\//,
    /-manifest\.json?$/,
    /middleware-/,
  ],
  globPublicPatterns: ["pglite/*.br", "fonts/*.ttf", "icons/icon.svg", "icons/icon-192.png"],
  // The hash in the name says what is in it: no need to pass the browser's own cache by.
  dontCacheBustURLsMatching: /^\/?(_next\/static\/|pglite\/)/,
  maximumFileSizeToCacheInBytes: 6 * 1024 * 1024,
});

export default withSerwist(config);
