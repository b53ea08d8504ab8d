/** The walls between the stages, as DEVELOPERS.md describes them. */
const stages = ["notes", "flask", "equilibrium", "advice", "report"];
const stage = (name) => `^shared-lib/${name}/`;

/** An earlier stage never imports a later one. `flask/types` and `equilibrium/types` are plain shapes that meet both ways. */
const oneDirection = [
  { from: "compounds", never: ["notes", "flask", "equilibrium", "advice", "report"] },
  { from: "constants", never: ["notes", "flask", "equilibrium", "advice", "report"] },
  { from: "media", never: ["notes", "flask", "equilibrium", "advice", "report"] },
  { from: "model", never: ["compounds", "constants", "media", ...stages] },
  { from: "notes", never: ["flask", "equilibrium", "advice", "report"] },
  { from: "flask", never: ["advice", "report"] },
  { from: "equilibrium", never: ["notes", "flask", "advice", "report"] },
  { from: "advice", never: ["report"] },
].map(({ from, never }) => ({
  name: `${from}-looks-back-only`,
  severity: "error",
  from: { path: stage(from) },
  to: { path: never.map(stage) },
}));

module.exports = {
  forbidden: [
    ...oneDirection,
    {
      name: "shared-lib-is-pure",
      comment: "No editor, no file system, no network, nothing of the server or the client.",
      severity: "error",
      from: { path: "^shared-lib/" },
      to: { path: ["^client/", "^server/", "vscode"] },
    },
    {
      name: "shared-lib-no-node",
      severity: "error",
      from: { path: "^shared-lib/" },
      to: { dependencyTypes: ["core"] },
    },
    {
      name: "structure-toolkit-behind-its-port",
      severity: "error",
      from: { pathNot: "^shared-lib/compounds/structure(\\.ts|/)" },
      to: { path: "node_modules/openchemlib" },
    },
    {
      name: "terminal-knows-no-editor",
      severity: "error",
      from: { path: "^client/terminal/" },
      to: { path: ["^client/editor/", "node_modules/vscode-"] },
    },
    {
      name: "editor-only-in-the-client",
      severity: "error",
      from: { pathNot: "^client/editor/|^tests/hosts/" },
      to: { path: "^vscode$" },
    },
    {
      name: "no-cycles",
      severity: "error",
      from: {},
      to: { circular: true, viaOnly: { dependencyTypesNot: ["type-only"] } },
    },
    { name: "resolvable", severity: "error", from: {}, to: { couldNotResolve: true, pathNot: "^vscode$" } },
  ],
  options: {
    doNotFollow: { path: "node_modules" },
    tsConfig: { fileName: "tsconfig.json" },
    tsPreCompilationDeps: true,
    enhancedResolveOptions: {
      exportsFields: ["exports"],
      conditionNames: ["import", "require", "node", "browser", "default"],
      extensions: [".ts", ".mts", ".js", ".mjs", ".json"],
    },
  },
};
