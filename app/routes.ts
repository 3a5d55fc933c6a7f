import { type RouteConfig, index, layout, route } from "@react-router/dev/routes";

// The table of contents of the product, grouped by area. Tests and the authorisation walk read this same table.
export default [
  // Pages of text, under the common strip
  layout("routes/with-strip.tsx", [
    index("routes/desk.tsx"),
    route("constructions", "routes/gallery.tsx"),
  ]),

  // The Bench has a strip of its own
  route("try", "routes/try.tsx"),

  // Files
  route("try/export/:format", "routes/try-export.ts"),

  // Service
  route("health", "routes/service/health.ts"),
] satisfies RouteConfig;
