/** @type {import('next').NextConfig} */
const config = {
  /** Native and WASM packages stay outside the bundle; highs finds its .wasm beside its own file. */
  serverExternalPackages: [
    'highs',
    'piscina',
    'better-sqlite3',
    '@node-rs/argon2',
    'smtp-server',
    'nodemailer',
    'mailparser',
    'ical-generator',
    'papaparse',
  ],
  /** `npm test` checks the types of everything; a start should not wait for it again. */
  typescript: { ignoreBuildErrors: true },
  poweredByHeader: false,
};
export default config;
