/* A workspace in memory for the browser host; its files come from workspace.json of the test server. Runs in the extension host (CommonJS). */
const vscode = require("vscode");

exports.activate = (context) => {
  const files = new Map();
  const folders = new Set(["/", "/notes"]);
  const changes = new vscode.EventEmitter();
  const loaded = (async () => {
    const bytes = await vscode.workspace.fs.readFile(vscode.Uri.joinPath(context.extensionUri, "workspace.json"));
    const given = JSON.parse(new TextDecoder().decode(bytes));
    for (const [name, text] of Object.entries(given)) files.set(`/notes/${name}`, new TextEncoder().encode(text));
  })();
  const missing = (uri) => vscode.FileSystemError.FileNotFound(uri);
  const provider = {
    onDidChangeFile: changes.event,
    watch: () => new vscode.Disposable(() => {}),
    async stat(uri) {
      await loaded;
      if (folders.has(uri.path)) return { type: vscode.FileType.Directory, ctime: 0, mtime: 0, size: 0 };
      const data = files.get(uri.path);
      if (!data) throw missing(uri);
      return { type: vscode.FileType.File, ctime: 0, mtime: 0, size: data.length };
    },
    async readDirectory(uri) {
      await loaded;
      const prefix = uri.path.endsWith("/") ? uri.path : `${uri.path}/`;
      const inside = [...files.keys()].filter((path) => path.startsWith(prefix));
      return inside.map((path) => [path.slice(prefix.length), vscode.FileType.File]);
    },
    async readFile(uri) {
      await loaded;
      const data = files.get(uri.path);
      if (!data) throw missing(uri);
      return data;
    },
    writeFile(uri, data) {
      files.set(uri.path, data);
      changes.fire([{ type: vscode.FileChangeType.Changed, uri }]);
    },
    createDirectory: (uri) => void folders.add(uri.path),
    delete: (uri) => void files.delete(uri.path),
    rename(from, to) {
      files.set(to.path, files.get(from.path));
      files.delete(from.path);
    },
  };
  context.subscriptions.push(
    vscode.workspace.registerFileSystemProvider("memory", provider, { isCaseSensitive: true }),
    vscode.workspace.registerFileSearchProvider("memory", {
      async provideFileSearchResults() {
        await loaded;
        return [...files.keys()].map((path) => vscode.Uri.from({ scheme: "memory", path }));
      },
    }),
  );
};
