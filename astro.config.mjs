import node from "@astrojs/node";
import react from "@astrojs/react";
import tailwindcss from "@tailwindcss/vite";
import { defineConfig, passthroughImageService } from "astro/config";
import { chunkOf } from "./chunks.mjs";
import { readyScripts } from "./ready-scripts.mjs";

/** Divides the scripts that browsers get; the server's are left as they are. */
const divided = {
  name: "divided-scripts",
  config: (_, { isSsrBuild }) =>
    isSsrBuild ? {} : { build: { rollupOptions: { output: { manualChunks: chunkOf(process.cwd()) } } } },
};

export default defineConfig({
  output: "server",
  adapter: node({ mode: "standalone" }),
  integrations: [react()],
  server: { host: "127.0.0.1", port: 4321 },
  devToolbar: { enabled: false },
  image: { service: passthroughImageService() },
  // The built server ignores Host unless hosts are allowed, and then refuses every form post. Any host is
  // allowed here because src/server/main.ts sets Host and X-Forwarded-* from TINPENNY_ORIGIN itself.
  security: { checkOrigin: true, allowedDomains: [{}] },
  experimental: { csp: true },
  vite: {
    plugins: [tailwindcss(), divided, readyScripts()],
    // Astro carries its own older zod; ours is bundled so that dev and build use the same one.
    ssr: { noExternal: ["zod"] },
    // Otherwise each write to the database reloads the page in development.
    server: { watch: { ignored: ["**/data/**"] } },
  },
});
