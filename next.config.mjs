import { PHASE_DEVELOPMENT_SERVER } from "next/constants.js";

/**
 * No other host is ever spoken to. Next.js puts its data into the page as inline scripts and styles; a nonce for them
 * would have to be woven in by proxy.ts on every request.
 */
function contentSecurityPolicy(isDevelopment) {
  return [
    "default-src 'self'",
    `script-src 'self' 'unsafe-inline'${isDevelopment ? " 'unsafe-eval'" : ""}`, // hot reload evaluates
    "style-src 'self' 'unsafe-inline'",
    "img-src 'self' blob: data:", // a chosen photograph is shown before it is sent
    "object-src 'none'",
    "base-uri 'self'",
    "form-action 'self'",
    "frame-ancestors 'none'",
  ].join("; ");
}

/** @returns {import("next").NextConfig} */
export default function settings(phase) {
  const headers = {
    "Content-Security-Policy": contentSecurityPolicy(phase === PHASE_DEVELOPMENT_SERVER),
    "X-Content-Type-Options": "nosniff",
    "X-Frame-Options": "DENY", // for browsers that do not know frame-ancestors
    "Referrer-Policy": "same-origin", // addresses hold the ids of rounds and cases
    "Permissions-Policy": "camera=(), microphone=(), geolocation=(), payment=(), usb=(), browsing-topics=()",
    "Cross-Origin-Opener-Policy": "same-origin",
    "Cross-Origin-Resource-Policy": "same-origin",
  };
  return {
    poweredByHeader: false,
    // The checkout itself, even when a folder above it holds a lockfile of its own.
    turbopack: { root: import.meta.dirname },
    outputFileTracingRoot: import.meta.dirname,
    // These load drivers or tasks by name while they run, which a bundle would lose.
    serverExternalPackages: ["knex", "pg", "graphile-worker", "sharp", "@node-rs/argon2", "@aws-sdk/client-s3"],
    // Photographs are served by our own handlers. Next's optimiser would keep copies of them on the disk.
    images: { unoptimized: true },
    // The tests check the types of everything; a first start need not wait for that.
    typescript: { ignoreBuildErrors: true },
    // next dev otherwise writes files into the checkout.
    agentRules: false,
    headers: async () => [
      { source: "/:path*", headers: Object.entries(headers).map(([key, value]) => ({ key, value })) },
    ],
  };
}
