// The rooms of src in layers: a room imports leaf files of rooms in earlier lines, never of its own line or later ones.
const layers = [
  ["errors"],
  ["references", "numeric"],
  ["constants"],
  ["quantity"],
  ["uncertainty", "formula"],
  ["regression"],
  ["heat-capacity"],
  ["species"],
  ["molecular", "water"],
  ["fugacity", "activity"],
  ["standard-state"],
  ["reaction"],
  ["compiled", "precision"],
  ["phase"],
  ["equilibrium", "electrochemistry"],
  ["measurement"],
  ["checks"],
  ["report"],
  ["exchange"],
];

const anyOf = (names) => `(?:${names.join("|")})`;
const typeOnly = ["type-only"];

const layerRules = layers.flatMap((line, index) =>
  line.map((room) => ({
    name: `layer-${room}`,
    comment: `${room} may import ${layers.slice(0, index).flat().join(", ") || "no other room"}`,
    severity: "error",
    from: { path: `^src/${room}/` },
    to: { path: "^src/[^/]+/", pathNot: `^src/${anyOf([room, "data", ...layers.slice(0, index).flat()])}/` },
  })),
);

module.exports = {
  forbidden: [
    ...layerRules,
    {
      name: "no-unknown-room",
      comment: "each folder of src is a room of the list above, or data",
      severity: "error",
      from: { path: "^src/[^/]+/", pathNot: `^src/${anyOf([...layers.flat(), "data"])}/` },
      to: {},
    },
    {
      name: "no-cycle",
      comment: "a cycle has no lower end to start reading at",
      severity: "error",
      from: { path: "^src/" },
      to: { circular: true },
    },
    {
      name: "no-face",
      comment: "a room imports leaf files, not an index.ts, src/index.ts or src/schema.ts",
      severity: "error",
      from: { path: "^src/[^/]+/" },
      to: { path: "/index\\.ts$|^src/schema\\.ts$" },
    },
    {
      name: "data-is-optional",
      comment: "no room of the library and no common face imports the reference data",
      severity: "error",
      from: { path: "^src/", pathNot: "^src/data/" },
      to: { path: "^src/data/" },
    },
    {
      name: "data-imports-types",
      comment: "data imports types alone",
      severity: "error",
      from: { path: "^src/data/" },
      to: { pathNot: "^src/data/", dependencyTypesNot: typeOnly },
    },
    {
      name: "schemas-apart",
      comment: "schemas load zod: only src/schema.ts, exchange and other schemas import them",
      severity: "error",
      from: { path: "^src/", pathNot: "/schema\\.ts$|^src/exchange/" },
      to: { path: "/schema\\.ts$" },
    },
    {
      name: "schema-of-own-room",
      comment: "a schema imports its own room and the schemas of earlier rooms",
      severity: "error",
      from: { path: "^src/([^/]+)/schema\\.ts$" },
      to: { path: "^src/", pathNot: "^src/$1/|/schema\\.ts$", dependencyTypesNot: typeOnly },
    },
    {
      name: "zod-in-schemas",
      comment: "importing zod takes some 90 ms",
      severity: "error",
      from: { path: "^src/", pathNot: "/schema\\.ts$|^src/exchange/" },
      to: { path: "node_modules/zod/" },
    },
    {
      name: "decimals-in-precision",
      comment: "decimal.js is loaded by precision alone",
      severity: "error",
      from: { path: "^src/", pathNot: "^src/precision/" },
      to: { path: "node_modules/decimal\\.js/" },
    },
    {
      name: "no-other-package",
      comment: "the library runs in every runtime and depends on zod and decimal.js alone",
      severity: "error",
      from: { path: "^src/" },
      to: { pathNot: "^src/|node_modules/(zod|decimal\\.js)/" },
    },
  ],
  options: {
    doNotFollow: { path: "node_modules" },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: "tsconfig.json" },
    combinedDependencies: true,
  },
};
