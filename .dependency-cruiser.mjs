/**
 * Who may import whom. A room is a folder below src; what a rule does not name is allowed.
 * @type {import("dependency-cruiser").IConfiguration}
 */
const own = "^src/";

/** Paths of src that a room may import besides itself and packages. */
function onlyFrom(name, from, allowed, comment) {
  return {
    name,
    severity: "error",
    comment,
    from: { path: from },
    to: { path: own, pathNot: [...allowed] },
  };
}

export default {
  forbidden: [
    { name: "no-cycles", severity: "error", from: {}, to: { circular: true } },
    {
      name: "no-orphans",
      severity: "error",
      comment: "A file that nobody imports is dead, unless the framework or a command starts it.",
      from: {
        orphan: true,
        path: own,
        pathNot: [
          "^src/app/",
          "^src/db/schema/",
          "^src/(proxy|instrumentation)\\.ts$",
          "^src/commands/",
          "\\.d\\.ts$",
        ],
      },
      to: {},
    },
    onlyFrom(
      "metrology-knows-nobody",
      "^src/metrology/",
      ["^src/metrology/"],
      "Numbers are made in a place that knows nothing of the web.",
    ),
    onlyFrom(
      "format-writes-numbers",
      "^src/format/",
      ["^src/format/", "^src/metrology/"],
      "How a number is written needs units alone.",
    ),
    onlyFrom(
      "ui-has-no-nouns",
      "^src/ui/",
      [
        "^src/ui/",
        "^src/format/",
        "^src/metrology/",
        "^src/data/edge/form-reply\\.ts$",
        "^src/data/access/errors\\.ts$",
      ],
      "Parts without nouns of the lab, and no fetching.",
    ),
    onlyFrom(
      "documents-draw",
      "^src/documents/",
      ["^src/documents/", "^src/metrology/", "^src/format/", "^src/db/vocabulary\\.ts$"],
      "A finished model in, bytes out.",
    ),
    onlyFrom("db-stores", "^src/db/", ["^src/db/", "^src/settings\\.ts$"], "How a thing is stored."),
    onlyFrom(
      "auth-proves-who",
      "^src/auth/",
      [
        "^src/auth/",
        "^src/db/",
        "^src/settings\\.ts$",
        "^src/data/access/",
        "^src/data/audit/",
        "^src/data/edge/require-own-origin\\.ts$",
      ],
      "Who is this: it knows the record of what happened, and no noun of the lab.",
    ),
    {
      name: "data-does-not-know-pages",
      severity: "error",
      from: { path: "^src/data/" },
      to: { path: "^src/(app|features|ui)/" },
    },
    {
      name: "a-noun-through-its-door",
      severity: "error",
      comment: "Other nouns are reached through their index; inputs and types are browser-safe.",
      from: { path: "^src/data/([^/]+)/" },
      to: {
        path: "^src/data/([^/]+)/.+",
        pathNot: [
          "^src/data/$1/",
          "^src/data/[^/]+/(index|inputs|types)\\.ts$",
          "^src/data/(access|audit|edge)/",
          "^src/data/cycles/(results|sheet/types)\\.ts$",
        ],
      },
    },
    {
      name: "no-feature-imports-another",
      severity: "error",
      comment: "Pages compose features.",
      from: { path: "^src/features/([^/]+)/" },
      to: { path: "^src/features/", pathNot: "^src/features/$1/" },
    },
    {
      name: "components-know-types-and-inputs",
      severity: "error",
      comment:
        "What runs in the browser takes from the data layer types, inputs and the sheet's arithmetic; actions take verbs.",
      from: { path: "^src/features/", pathNot: "/actions\\.ts$" },
      to: {
        path: "^src/data/",
        pathNot: [
          "/inputs\\.ts$",
          "-inputs\\.ts$",
          "^src/data/fields\\.ts$",
          "^src/data/cycles/(sheet/|draft-fields)",
        ],
        dependencyTypesNot: ["type-only"],
      },
    },
    {
      name: "features-do-not-reach-down",
      severity: "error",
      comment: "The server decides: features know the data layer's doors, never the database.",
      from: { path: "^src/features/" },
      to: { path: "^src/(app|db|documents|commands)/", pathNot: "^src/db/vocabulary\\.ts$" },
    },
    {
      name: "pages-do-not-reach-down",
      severity: "error",
      from: { path: "^src/app/", pathNot: "^src/app/api/health/" },
      to: { path: "^src/(db|documents|commands)/", pathNot: "^src/db/vocabulary\\.ts$" },
    },
    {
      name: "lucia-only-in-auth",
      severity: "error",
      from: { path: own, pathNot: "^src/auth/" },
      to: { path: "node_modules/(lucia|@lucia-auth)" },
    },
    {
      name: "src-stands-alone",
      severity: "error",
      from: { path: own },
      to: { path: "^(seed|tests|local-services)/" },
    },
  ],
  options: {
    doNotFollow: { path: "node_modules" },
    exclude: { path: "(^|/)node_modules/(?!lucia|@lucia-auth)" },
    tsConfig: { fileName: "tsconfig.json" },
    tsPreCompilationDeps: true,
    enhancedResolveOptions: { conditionNames: ["import", "require", "node", "default", "types"] },
  },
};
