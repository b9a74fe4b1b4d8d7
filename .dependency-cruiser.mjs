// The boundaries of DEVELOPERS.md, held by a rule. The features' own names are matched by pattern, so
// that a new feature is guarded the day its folder is made.
const toSibling = (root) => ({
  name: `${root}-features-keep-apart`,
  comment: "A feature reaches no other feature's insides: they meet where the application is wired.",
  severity: "error",
  from: { path: `^${root}/features/([^/]+)/` },
  to: { path: `^${root}/features/`, pathNot: `^${root}/features/$1/` },
});

const layer = (name, from, to, comment) => ({
  name,
  comment,
  severity: "error",
  from: { path: from },
  to: { path: to },
});

export default {
  forbidden: [
    { name: "no-cycles", severity: "error", from: {}, to: { circular: true } },
    layer(
      "shared-stands-alone",
      "^shared/",
      "^(src|server|tests|scripts)/",
      "shared runs anywhere and knows neither side.",
    ),
    {
      name: "shared-needs-no-platform",
      comment: "No React, Node or DOM packages at run time in shared.",
      severity: "error",
      from: { path: "^shared/" },
      to: {
        path: "^node_modules/(react|react-dom|express|better-sqlite3|drizzle-orm)/",
        dependencyTypesNot: ["type-only"],
      },
    },
    {
      name: "shared-needs-no-node",
      severity: "error",
      from: { path: "^shared/" },
      to: { dependencyTypes: ["core"] },
    },
    layer(
      "client-not-server",
      "^src/",
      "^server/",
      "The client meets the server only through shared contracts.",
    ),
    layer(
      "server-not-client",
      "^server/",
      "^src/",
      "The server meets the client only through shared contracts.",
    ),
    toSibling("src"),
    toSibling("server"),
    layer(
      "components-know-no-domain",
      "^src/components/",
      "^src/(features|editor|app)/",
      "The kit is without domain knowledge.",
    ),
    layer(
      "lib-is-lowest",
      "^src/lib/",
      "^src/(features|editor|app|components)/",
      "lib imports nothing of the interface.",
    ),
    layer(
      "editor-knows-no-feature",
      "^src/editor/",
      "^src/(features|app)/",
      "Node views are handed in by src/app.",
    ),
    layer(
      "features-not-app",
      "^src/features/",
      "^src/app/",
      "src/app composes features, not the other way round.",
    ),
    {
      name: "only-repositories-query",
      comment: "Everything else in a feature leaves Drizzle to its repositories.",
      severity: "error",
      from: { path: "^server/features/", pathNot: "repository\\.ts$" },
      to: { path: "^node_modules/drizzle-orm/" },
    },
    layer(
      "nothing-imports-tests",
      "^(src|server|shared|scripts)/",
      "^tests/",
      "Tests are not part of the product.",
    ),
  ],
  options: {
    doNotFollow: { path: "node_modules" },
    exclude: { path: "^dist/" },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: "tsconfig.json" },
    enhancedResolveOptions: {
      extensions: [".ts", ".tsx", ".mjs", ".js"],
      conditionNames: ["import", "node", "default"],
    },
    moduleSystems: ["es6"],
  },
};
