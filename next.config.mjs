/** @type {import('next').NextConfig} */
const nextConfig = {
  // The test run builds beside a running development server; two builds in one folder would destroy each other.
  distDir: process.env.NEXT_DIST_DIR ?? '.next',
  poweredByHeader: false,
  productionBrowserSourceMaps: false,
  // `npm test` checks types of everything, tests included; a second check here would only make starting slow.
  typescript: { ignoreBuildErrors: true },
  // The application may lie inside a folder that has a lock file of its own.
  turbopack: { root: import.meta.dirname },
  // These load native parts, workers or data files relative to themselves, which a bundle breaks.
  serverExternalPackages: [
    '@react-pdf/renderer',
    'bwip-js',
    '@node-rs/argon2',
    'pg',
    'pg-boss',
    'pdfjs-dist',
    'pino',
    'nodemailer',
    'archiver',
  ],
  allowedDevOrigins: ['localhost', '127.0.0.1'],
};

export default nextConfig;
