import { type RouteConfig, index, layout, prefix, route } from "@react-router/dev/routes";

// The table of contents of the product, grouped by area. Tests and the authorisation walk read this same table.
export default [
  // Pages of text, under the common strip
  layout("routes/with-strip.tsx", [
    index("routes/desk.tsx"),
    route("constructions", "routes/gallery.tsx"),
    ...prefix("cartons", [index("routes/cartons/list.tsx"), route("new", "routes/cartons/new.tsx")]),
    ...prefix("templates", [index("routes/templates/list.tsx"), route(":templateId", "routes/templates/$templateId.tsx")]),
    ...prefix("clients", [index("routes/clients/list.tsx"), route(":clientId", "routes/clients/$clientId.tsx")]),
    route("trash", "routes/trash.tsx"),
    route("account", "routes/account/account.tsx"),
    route("people", "routes/account/people.tsx"),
    route("first-run", "routes/auth/first-run.tsx"),
    route("*", "routes/not-found.tsx"),
  ]),

  // The Bench has a strip of its own
  route("cartons/:cartonId", "routes/cartons/$cartonId.tsx"),
  route("try", "routes/try.tsx"),

  // Signing in and out
  route("sign-in", "routes/auth/sign-in.tsx"),
  route("sign-out", "routes/auth/sign-out.ts"),

  // Files
  route("cartons/csv", "routes/cartons/csv.ts"),
  route("templates/csv", "routes/templates/csv.ts"),
  route("clients/csv", "routes/clients/csv.ts"),
  route("cartons/:cartonId/export/:format", "routes/cartons/export.ts"),
  route("try/export/:format", "routes/try-export.ts"),

  // Service
  route("health", "routes/service/health.ts"),
] satisfies RouteConfig;
