import { reactRouter } from "@react-router/dev/vite";
import tailwindcss from "@tailwindcss/vite";
import { defineConfig } from "vite";

export default defineConfig({
  plugins: [tailwindcss(), reactRouter()],
  resolve: { tsconfigPaths: true },
  // Listed so that the first visit to a lazily loaded page does not reload it in development.
  optimizeDeps: { include: ["three", "@react-three/fiber", "zod", "clipper2-ts"] },
  // Fonts as files, never inside the style sheet: the content security policy takes them from this site alone.
  build: { assetsInlineLimit: 0 },
  server: { host: "127.0.0.1" },
});
