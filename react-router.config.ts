import type { Config } from "@react-router/dev/config";

export default {
  ssr: true,
  // The tests build into a folder of their own, beside the one a running server reads from.
  buildDirectory: process.env.BUILD_DIRECTORY ?? "build",
  future: {
    v8_middleware: true,
    v8_splitRouteModules: true,
    v8_viteEnvironmentApi: true,
    v8_passThroughRequests: true,
    v8_trailingSlashAwareDataRequests: true,
  },
} satisfies Config;
