import { type RouteConfig, index, route } from "@react-router/dev/routes";

// The table of contents of the product, grouped by area. Tests and the authorisation walk read this same table.
export default [
  index("routes/home.tsx"),

  // Service
  route("health", "routes/service/health.ts"),
] satisfies RouteConfig;
