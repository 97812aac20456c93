// The help pages, one a function, made from the table of functions: plain HTML that prints.
import { helpStyle } from "./helpStyle.mjs";

const TOPICS = {
  plan: "How many to score first",
  describe: "What the scores look like",
  cutoff: "Where the mark stands",
  search: "How long the search will be",
  stopping: "When to stop",
  risk: "What can go wrong",
  combine: "From criteria to one score",
  watch: "While it runs",
  simulate: "Trying it out",
  audit: "For the auditor",
};

/** @returns {[path: string, text: string][]} */
export function helpPages(table, methods) {
  return [
    ["help/help.css", helpStyle],
    ["help/index.html", indexPage(table)],
    ...table.map((entry) => [entry.helpPath, functionPage(entry, table, methods)]),
  ];
}

function functionPage(entry, table, methods) {
  const { name, topic, description, parameters, returns, examples, questions, cautions } = entry;
  const signature = (separator) =>
    `=WEIR.${name}(${parameters.map((one) => (one.optional ? `[${one.name}]` : one.name)).join(`${separator} `)})`;
  const [lead, rest] = firstSentence(description);
  const siblings = table.filter((one) => one.topic === topic && one !== entry);
  return page(
    `WEIR.${name}`,
    `<p class="topic"><a href="index.html">Cell functions</a> · <a href="index.html#${topic}">${escape(TOPICS[topic] ?? topic)}</a></p>
<h1>${breakable(`WEIR.${name}`)}</h1>
<p class="lead">${escape(lead)}</p>
${rest ? `<p>${escape(rest)}</p>` : ""}
${list("Cautions", cautions, "caution")}
<h2>How to write it</h2>
<pre><code>${escape(signature(","))}</code></pre>
${parameters.length > 1 ? `<p>Where the sheet takes a semicolon between arguments:</p>\n<pre><code>${escape(signature(";"))}</code></pre>` : ""}
${parameters.length > 0 ? `<h2>What it takes</h2>\n<dl>${parameters.map(parameterText).join("\n")}</dl>` : ""}
<h2>What it gives</h2>
<p>${escape(returns)}</p>
<h2>Examples</h2>
${examples.map(exampleText).join("\n")}
${list("Questions that it answers", questions)}
${methods
  .filter(({ functions }) => functions.includes(name))
  .map(methodText)
  .join("\n")}
${siblings.length > 0 ? `<h2>Beside it</h2>\n<ul class="names">${siblings.map(nameLink).join("\n")}</ul>` : ""}`,
  );
}

function indexPage(table) {
  const topics = Object.entries(TOPICS)
    .map(([topic, title]) => [topic, title, table.filter((entry) => entry.topic === topic)])
    .filter(([, , entries]) => entries.length > 0);
  return page(
    "Cell functions",
    `<h1>Cell functions</h1>
<p class="lead">Each is typed into a cell behind <code>=WEIR.</code> and takes cells, ranges or plain values.</p>
${topics.map(([topic, title, entries]) => `<h2 id="${topic}">${escape(title)}</h2>\n<dl>${entries.map(indexRow).join("\n")}</dl>`).join("\n")}`,
  );
}

function indexRow(entry) {
  return `<dt>${nameAnchor(entry)}</dt><dd>${escape(firstSentence(entry.description)[0])}</dd>`;
}

function nameLink(entry) {
  return `<li>${nameAnchor(entry)}</li>`;
}

function nameAnchor({ name, helpPath }) {
  return `<a href="${escape(helpPath.replace(/^help\//, ""))}">${breakable(name)}</a>`;
}

function parameterText({ name, description, optional, dimensionality }) {
  const kind = dimensionality === "matrix" ? "one cell or a range" : "one cell or value";
  return `<dt><code>${escape(name)}</code> <span class="kind">${kind}${optional ? ", may be left out" : ""}</span></dt><dd>${escape(description)}</dd>`;
}

function exampleText({ formula, value }) {
  const semicolon = withSemicolons(formula);
  const other = semicolon === undefined || semicolon === formula ? "" : `\n${escape(semicolon)}`;
  return `<div class="example"><pre><code>${escape(formula)}${other}</code></pre>\n<p class="gives">gives</p>${valueText(JSON.parse(value))}</div>`;
}

/** How it is computed, what it takes for granted and how exact it is: the page of its method, folded by section. */
function methodText({ title, sections }) {
  const section = ({ heading, paragraphs }) =>
    `<h3>${escape(heading)}</h3>\n${paragraphs.map((one) => `<p>${markedText(one)}</p>`).join("\n")}`;
  return `<section class="method"><h2>The method: ${escape(title)}</h2>\n${sections.map(section).join("\n")}</section>`;
}

/** Code, bold and italic words of the method pages. */
function markedText(text) {
  return text
    .split(/(`[^`]+`)/)
    .map((part) => {
      if (part.startsWith("`") && part.length > 1) return `<code>${breakable(part.slice(1, -1))}</code>`;
      return escape(part)
        .replace(/\*\*([^*]+)\*\*/g, "<strong>$1</strong>")
        .replace(/\*([^*]+)\*/g, "<em>$1</em>");
    })
    .join("");
}

function valueText(value) {
  if (!Array.isArray(value)) return `<p class="value">${escape(cellText(value))}</p>`;
  const cell = (one) => `<td${typeof one === "number" ? ' class="number"' : ""}>${escape(cellText(one))}</td>`;
  const rows = value.map((row) => `<tr>${row.map(cell).join("")}</tr>`).join("");
  // A wide table scrolls by itself, also with the keyboard; the page never does.
  return `<div class="wide" tabindex="0" role="region" aria-label="The value"><table>${rows}</table></div>`;
}

function cellText(value) {
  return typeof value === "boolean" ? String(value).toUpperCase() : String(value);
}

/**
 * A formula as typed where the comma is the decimal sign. Undefined with an array constant in it: what parts its columns differs from
 * one country to the next.
 */
export function withSemicolons(formula) {
  const parts = formula.split(/("(?:[^"]|"")*")/);
  if (parts.some((part, index) => index % 2 === 0 && part.includes("{"))) return undefined;
  return parts
    .map((part, index) => (index % 2 === 1 ? part : part.replace(/,/g, ";").replace(/(\d)\.(\d)/g, "$1,$2")))
    .join("");
}

/** The first sentence of a description, and what follows it. */
function firstSentence(text) {
  const end = /[.](?= [A-Z])/.exec(text);
  return end ? [text.slice(0, end.index + 1), text.slice(end.index + 2)] : [text, ""];
}

function list(title, sentences, kind = "") {
  if (sentences.length === 0) return "";
  const open = kind ? `<section class="${kind}">` : "<section>";
  return `${open}<h2>${title}</h2>\n<ul>${sentences.map((one) => `<li>${escape(one)}</li>`).join("\n")}</ul></section>`;
}

function page(title, body) {
  return `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>${escape(title)} – Weirmark</title>
<link rel="stylesheet" href="help.css">
<link rel="icon" href="../icons/icon-32.png">
</head>
<body>
<main>
${body}
</main>
</body>
</html>
`;
}

/** A long name may break after its dot and underscores, else it runs out of a narrow page. */
function breakable(name) {
  return escape(name).replace(/[._]/g, "$&<wbr>");
}

function escape(text) {
  return String(text).replace(/[&<>"]/g, (sign) => ({ "&": "&amp;", "<": "&lt;", ">": "&gt;", '"': "&quot;" })[sign]);
}
