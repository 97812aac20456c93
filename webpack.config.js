// Three builds into dist/: the add-in (host files, functions, task pane, help), the trial page, the command line.
// A build whose entry isn't there is left out. WEIRMARK_ORIGIN says where the add-in will be served from.
const { chmodSync, existsSync, readFileSync } = require("node:fs");
const { join } = require("node:path");
const CopyPlugin = require("copy-webpack-plugin");
const HtmlPlugin = require("html-webpack-plugin");
const MiniCssExtractPlugin = require("mini-css-extract-plugin");
const TerserPlugin = require("terser-webpack-plugin");
const { BannerPlugin, Compilation, DefinePlugin, IgnorePlugin, optimize, sources } = require("webpack");

const TABLE = "src/functions/functions.json";
const DEFAULT_ORIGIN = "https://localhost:3000";
const origin = (process.env.WEIRMARK_ORIGIN || DEFAULT_ORIGIN).replace(/\/+$/, "");
const at = (...parts) => join(__dirname, ...parts);
const present = (entries) => Object.fromEntries(Object.entries(entries).filter(([, file]) => existsSync(file)));

function build(name, mode, entry, rest) {
  const { plugins = [], output = {}, optimization = {}, ...others } = rest;
  return {
    name,
    mode,
    entry,
    target: ["web", "es2020"],
    devtool: false,
    context: __dirname,
    cache: {
      type: "filesystem",
      name: `${name}-${mode}`,
      cacheDirectory: at(".cache/webpack"),
      buildDependencies: { config: [__filename] },
    },
    output: { path: at("dist"), publicPath: "auto", ...output },
    resolve: { extensions: [".ts", ".mjs", ".js", ".json"] },
    module: {
      rules: [
        {
          test: /\.ts$/,
          exclude: /node_modules/,
          loader: "ts-loader",
          options: { transpileOnly: true, compilerOptions: { noEmit: false } },
        },
        { test: /\.m?js$/, resolve: { fullySpecified: false } },
        { test: /\.css$/, use: [MiniCssExtractPlugin.loader, "css-loader"] },
      ],
    },
    optimization: {
      minimizer: [
        new TerserPlugin({
          minify: TerserPlugin.esbuildMinify,
          terserOptions: { target: "es2020", legalComments: "none" },
          extractComments: false,
        }),
      ],
      ...optimization,
    },
    performance: false,
    stats: { preset: "errors-warnings", assets: false },
    plugins,
    ...others,
  };
}

/** Files that are made, not compiled: `files` gives [path, text] pairs and is asked anew in every build. */
class GeneratedFiles {
  constructor(source, files) {
    Object.assign(this, { source, files });
  }
  apply(compiler) {
    compiler.hooks.thisCompilation.tap("GeneratedFiles", (compilation) => {
      compilation.fileDependencies.add(this.source);
      const stage = Compilation.PROCESS_ASSETS_STAGE_ADDITIONAL;
      compilation.hooks.processAssets.tap({ name: "GeneratedFiles", stage }, () => {
        for (const [path, text] of this.files()) compilation.emitAsset(path, new sources.RawSource(text));
      });
    });
  }
}

class MakeExecutable {
  constructor(path) {
    this.path = path;
  }
  apply(compiler) {
    compiler.hooks.afterEmit.tap("MakeExecutable", () => chmodSync(this.path, 0o755));
  }
}

/** Names of the functions that Excel loads when a cell first asks for one: those in the files that src/functions/later.ts imports. */
function laterNames() {
  const imported = readFileSync(at("src/functions/later.ts"), "utf8").matchAll(/from "\.\/([\w.]+)"/g);
  const names = [...imported].flatMap(([, file]) => [
    ...readFileSync(at(`src/functions/${file}.ts`), "utf8").matchAll(/@customfunction (\w+)/g),
  ]);
  return new Set(names.map(([, name]) => name));
}

/** Names out of the table of functions, as code: the functions bundle needs no more of the table. */
function functionNames(chosen) {
  const names = () => JSON.parse(readFileSync(at(TABLE), "utf8")).filter(chosen);
  return DefinePlugin.runtimeValue(() => JSON.stringify(names().map(({ name }) => name)), [at(TABLE)]);
}

function addIn(mode, hostFiles) {
  const entry = present({
    functions: at("src/hosts/excel/functions.ts"),
    taskpane: at("src/taskpane/excel.ts"),
  });
  const page = at("src/taskpane/taskpane.html");
  return build("add-in", mode, entry, {
    // The host's manifest names functions.js, so it keeps its plain name; the rest is loaded by hash.
    output: { filename: "[name].js", chunkFilename: "pane/[name].[contenthash:8].js" },
    plugins: [
      new DefinePlugin({
        SPILLING_FUNCTIONS: functionNames(({ result }) => result === "matrix"),
        LATER_FUNCTIONS: functionNames(({ name }) => laterNames().has(name)),
      }),
      new GeneratedFiles(at(TABLE), () => hostFiles(origin)),
      new MiniCssExtractPlugin({ filename: "[name].css", chunkFilename: "pane/[name].[contenthash:8].css" }),
      new CopyPlugin({
        patterns: [
          {
            from: at("manifest"),
            noErrorOnMissing: true,
            transform: (content, path) =>
              /\.(xml|json)$/.test(path) ? content.toString().replaceAll(DEFAULT_ORIGIN, origin) : content,
          },
        ],
      }),
      ...(existsSync(page)
        ? [new HtmlPlugin({ template: page, filename: "taskpane.html", chunks: Object.keys(entry), inject: "head" })]
        : []),
    ],
  });
}

function trialPage(mode) {
  const entry = present({ trial: at("src/trial/main.ts") });
  return build("trial", mode, entry, {
    output: { filename: "trial/[name].[contenthash:8].js", chunkFilename: "trial/[name].[contenthash:8].js" },
    // In parts a browser reads it on several threads: ready a fifth sooner than with one file of six megabytes.
    optimization: { splitChunks: { chunks: "all", maxSize: 1_800_000 } },
    plugins: [
      // Hyphenation of seventy languages that this page never asks for.
      new IgnorePlugin({ resourceRegExp: /^\.\/(?!en-)[a-z-]+(-\d+)?-[\w-]{8}\.js$/, contextRegExp: /engine-render/ }),
      new MiniCssExtractPlugin({
        filename: "trial/[name].[contenthash:8].css",
        chunkFilename: "trial/[name].[contenthash:8].css",
        ignoreOrder: true,
      }),
      new HtmlPlugin({ template: at("src/trial/index.html"), filename: "index.html", inject: "head" }),
    ],
  });
}

function commandLine(mode) {
  const entry = present({ weirmark: at("src/cli/weirmark.ts") });
  return build("cli", mode, entry, {
    target: "node20",
    output: { path: at("dist/cli"), filename: "[name].js" },
    optimization: { minimize: false },
    plugins: [
      new BannerPlugin({ banner: "#!/usr/bin/env node", raw: true }),
      new optimize.LimitChunkCountPlugin({ maxChunks: 1 }),
      new MakeExecutable(at("dist/cli/weirmark.js")),
    ],
  });
}

module.exports = async (_env, { mode = "production" }) => {
  const { hostFiles } = await import("./scripts/hostFiles.mjs");
  const builds = [addIn(mode, hostFiles), trialPage(mode), commandLine(mode)];
  return builds.filter(({ name, entry }) => name === "add-in" || Object.keys(entry).length > 0);
};
