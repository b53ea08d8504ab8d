/** The panel's page: fixed markup, nothing from a note, a policy that lets in our own script and styles only. */

import * as vscode from "vscode";

const NONCE_BYTES = 16;

/** Markup of the page. Figures and names arrive later as messages and are set as text. */
export function panelHtml(
  webview: vscode.Webview,
  folders: { readonly media: vscode.Uri; readonly dist: vscode.Uri },
): string {
  const nonce = randomHex(NONCE_BYTES);
  const address = (folder: vscode.Uri, file: string): string =>
    webview.asWebviewUri(vscode.Uri.joinPath(folder, file)).toString();
  return pageMarkup({
    nonce,
    cspSource: webview.cspSource,
    script: address(folders.dist, "panel.js"),
    styles: [address(folders.dist, "panel.css"), address(folders.media, "panel.css")],
    language: vscode.env.language,
  });
}

interface PageParts {
  readonly nonce: string;
  readonly cspSource: string;
  readonly script: string;
  readonly styles: readonly string[];
  readonly language: string;
}

/** Exported for the test that reads its policy and for the accessibility run. */
export function pageMarkup({ nonce, cspSource, script, styles, language }: PageParts): string {
  const policy = `default-src 'none'; style-src ${cspSource}; script-src 'nonce-${nonce}'; img-src ${cspSource} data:; font-src ${cspSource}`;
  return `<!DOCTYPE html>
<html lang="${language}">
<head>
<meta charset="utf-8">
<meta http-equiv="Content-Security-Policy" content="${policy}">
<meta name="viewport" content="width=device-width, initial-scale=1">
${styles.map((style) => `<link rel="stylesheet" href="${style}">`).join("\n")}
<title>Forms in the flask</title>
</head>
<body>
<main>
<h1 id="title">Forms in the flask</h1>
<p id="conditions" role="status"></p>
<div class="row">
<label for="axis">Plot against</label>
<select id="axis">
<option value="water">water share</option>
<option value="pH">pH</option>
<option value="temperature">temperature</option>
<option value="concentration">concentration</option>
<option value="time">time</option>
</select>
<button type="button" id="save-svg">Save SVG</button>
<button type="button" id="save-png">Save PNG</button>
<button type="button" id="save-csv">Save CSV</button>
</div>
<figure>
<div id="plot" role="img" aria-labelledby="title conditions"></div>
<figcaption id="caption"></figcaption>
</figure>
<section aria-labelledby="change"><h2 id="change">What if</h2>
<div id="controls"></div>
<button type="button" id="reset">Back to the note</button>
</section>
<section aria-labelledby="events"><h2 id="events">The flask through the note</h2>
<ol id="timeline"></ol>
</section>
<details><summary>Figures as a table</summary>
<div id="table" tabindex="0" role="region" aria-label="Figures as a table"></div>
</details>
</main>
<script nonce="${nonce}" src="${script}"></script>
</body>
</html>`;
}

function randomHex(bytes: number): string {
  const random = crypto.getRandomValues(new Uint8Array(bytes));
  return [...random].map((byte) => byte.toString(16).padStart(2, "0")).join("");
}
