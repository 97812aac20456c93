// The one style sheet of the help pages.
export const helpStyle = `:root {
  color-scheme: light dark;
  --ink: #1c2024;
  --quiet: #565e66;
  --paper: #ffffff;
  --rule: #c3cad0;
  --accent: #0b4a6b;
}
@media (prefers-color-scheme: dark) {
  :root {
    --ink: #e8eaec;
    --quiet: #aab3bb;
    --paper: #16191c;
    --rule: #4a535b;
    --accent: #86c5e6;
  }
}
* {
  box-sizing: border-box;
}
body {
  margin: 0 auto;
  padding: 1.5rem 1rem 4rem;
  max-width: 44rem;
  background: var(--paper);
  color: var(--ink);
  font: 1rem/1.55 system-ui, sans-serif;
  font-variant-numeric: tabular-nums;
}
a {
  color: var(--accent);
}
.topic,
.kind,
.gives {
  color: var(--quiet);
  font-size: 0.875rem;
}
h1 {
  margin: 0.25rem 0 0.5rem;
  font-size: 1.6rem;
  font-weight: 600;
  line-height: 1.2;
}
h2 {
  margin: 2rem 0 0.5rem;
  font-size: 1rem;
  font-weight: 600;
}
.lead {
  margin: 0 0 0.75rem;
  font-size: 1.15rem;
}
h3 {
  margin: 1.25rem 0 0.25rem;
  font-size: 0.9375rem;
  font-weight: 600;
}
.method p {
  margin: 0.25rem 0 0.5rem;
  overflow-wrap: break-word;
}
.caution {
  margin-top: 1.5rem;
  padding-left: 1rem;
  border-left: 3px solid var(--accent);
}
.caution h2 {
  margin-top: 0;
}
.topic,
.gives {
  margin: 0.5rem 0 0;
}
pre {
  margin: 0.25rem 0;
  white-space: pre-wrap;
  overflow-wrap: anywhere;
}
code {
  font: 0.925rem/1.5 ui-monospace, monospace;
}
ul {
  margin: 0;
  padding-left: 1.1rem;
}
.names {
  list-style: none;
  padding: 0;
  font-size: 0.925rem;
}
dl {
  margin: 0;
}
dt {
  margin-top: 0.75rem;
}
dd {
  margin: 0;
}
.example {
  padding: 0.5rem 0;
  border-top: 1px solid var(--rule);
}
.value {
  margin: 0;
  font-weight: 600;
}
.wide {
  overflow-x: auto;
}
table {
  border-collapse: collapse;
}
td {
  padding: 0.15rem 1.5rem 0.15rem 0;
  border-bottom: 1px solid var(--rule);
}
.number {
  text-align: right;
}
@media print {
  :root {
    --ink: #000;
    --quiet: #333;
    --paper: #fff;
    --accent: #000;
  }
  .topic,
  .names {
    display: none;
  }
  .example {
    break-inside: avoid;
  }
}
`;
