/**
 * Two bundles, one after the other, into dist/:
 *
 * functions  functions.js, the worksheet functions alone: one classic script without chunks, because Excel's
 *            function runtime and the local sheet both load exactly this one file. Never mark this package
 *            `sideEffects: false`: the associations are side effects and would be dropped silently.
 * pages      the task pane and the local sheet. Only the local sheet carries the grid engine.
 */
import { existsSync, mkdirSync, writeFileSync } from "node:fs";
import { dirname, relative, resolve } from "node:path";
import { fileURLToPath } from "node:url";
import CopyPlugin from "copy-webpack-plugin";
import HtmlPlugin from "html-webpack-plugin";
import MiniCssExtractPlugin from "mini-css-extract-plugin";
import TerserPlugin from "terser-webpack-plugin";
import webpack from "webpack";
import styleHashes from "./src/local-sheet/style-hashes.json" with { type: "json" };

const root = dirname(fileURLToPath(import.meta.url));
const at = (...path) => resolve(root, ...path);

/** The host of Office.js, the one script that is not our own; its vendor supports no other place. */
const OFFICE = "https://appsforoffice.microsoft.com";

/** Everything from our own origin and nothing else but what is named; inline styles only by their hash. */
function contentSecurityPolicy({ scripts = [], hashes = [] } = {}) {
  const styles = ["'self'", ...hashes.map((hash) => `'${hash}'`)].join(" ");
  return [
    "default-src 'none'",
    `script-src ${["'self'", ...scripts].join(" ")}`,
    `style-src ${styles}`,
    "img-src 'self' data:",
    "connect-src 'self'",
    "base-uri 'none'",
    "form-action 'none'",
  ].join("; ");
}

const page = (name, template, policy) =>
  new HtmlPlugin({
    filename: `${name}.html`,
    template: at(template),
    chunks: [name],
    scriptLoading: "defer",
    templateParameters: { policy, office: `${OFFICE}/lib/1/hosted/office.js` },
    minify: false,
  });

/** Copies a folder flat; a folder that is generated later may still be absent. */
const folder = (from, to, ignore = []) =>
  existsSync(at(from))
    ? [{ from: at(from), to: at("dist", to), noErrorOnMissing: true, globOptions: { ignore } }]
    : [];

/**
 * Writes down which files of which packages went into a bundle, into .cache/bundled/: `src/build/licences` reads what
 * ships from there, and nothing that only helped to build it.
 */
class BundledPackages {
  apply(compiler) {
    compiler.hooks.afterEmit.tap("BundledPackages", ({ modules }) => {
      const files = new Set();
      // Modules that were merged into one stand inside it.
      const collect = (module) => {
        for (const inner of module.modules ?? []) collect(inner);
        const file = module.nameForCondition?.();
        if (file?.includes("node_modules")) files.add(relative(root, file).replaceAll("\\", "/"));
      };
      for (const module of modules) collect(module);
      mkdirSync(at(".cache/bundled"), { recursive: true });
      const list = JSON.stringify([...files].sort(), null, 2);
      writeFileSync(at(".cache/bundled", `${compiler.options.name}.json`), `${list}\n`);
    });
  }
}

const shared = {
  context: root,
  mode: "production",
  // No source maps: they would carry the paths of the machine that built them.
  devtool: false,
  target: ["web", "es2022"],
  resolve: { extensions: [".ts", ".js"] },
  optimization: {
    minimizer: [new TerserPlugin({ minify: TerserPlugin.esbuildMinify, extractComments: false })],
  },
  performance: { hints: false },
  stats: "errors-warnings",
};

const typescript = (folderOfConfig) => ({
  test: /\.ts$/,
  exclude: /node_modules/,
  // Types are checked by `tsc` over each folder; here they are only taken away. `noEmit` of the shared
  // tsconfig would leave nothing to bundle.
  use: {
    loader: "ts-loader",
    options: {
      transpileOnly: true,
      configFile: at(folderOfConfig, "tsconfig.json"),
      compilerOptions: { noEmit: false, allowImportingTsExtensions: false },
    },
  },
});

const functions = {
  ...shared,
  name: "functions",
  entry: { functions: at("src/functions/associate.ts") },
  plugins: [new BundledPackages()],
  module: { rules: [typescript("src/functions")] },
  output: { path: at("dist"), filename: "[name].js", clean: true },
  optimization: { ...shared.optimization, splitChunks: false, runtimeChunk: false },
};

/** The pane's picture by its name; the grid engine's own chunks by their number. */
const chunkName =
  (ending) =>
  ({ chunk }) =>
    `${chunk?.name ? "[name]" : "sheet.[id]"}.${ending}`;

const pages = {
  ...shared,
  name: "pages",
  // A chunk is what an import() brings, its packages with it: the pane's picture is one file.
  optimization: { ...shared.optimization, splitChunks: { cacheGroups: { defaultVendors: false } } },
  entry: { taskpane: at("src/taskpane/index.ts"), sheet: at("src/local-sheet/index.ts") },
  module: {
    rules: [
      typescript("src/local-sheet"),
      { test: /\.css$/, use: [MiniCssExtractPlugin.loader, "css-loader"] },
      { test: /\.(svg|woff2?|ttf)$/, type: "asset/resource" },
    ],
  },
  output: {
    path: at("dist"),
    filename: "[name].js",
    chunkFilename: chunkName("js"),
    assetModuleFilename: "assets/[name][ext]",
  },
  plugins: [
    new BundledPackages(),
    // The grid engine's hyphenation patterns of sixty languages; it asks for English alone.
    new webpack.IgnorePlugin({
      resourceRegExp: /^\.\/(?!en-)[a-z0-9-]+-[\w-]{8}\.js$/,
      contextRegExp: /engine-render/,
    }),
    new MiniCssExtractPlugin({ filename: "[name].css", chunkFilename: chunkName("css") }),
    page("taskpane", "src/taskpane/taskpane.html", contentSecurityPolicy({ scripts: [OFFICE] })),
    page("sheet", "src/local-sheet/sheet.html", contentSecurityPolicy({ hashes: styleHashes })),
    new CopyPlugin({
      patterns: [
        { from: at("src/catalogue/functions.json"), to: at("dist/functions.json") },
        { from: at("src/taskpane/shortcuts.json"), to: at("dist/shortcuts.json") },
        { from: at("manifest.xml"), to: at("dist/manifest.xml"), noErrorOnMissing: true },
        ...folder("src/assets", "assets"),
        // The pictures are the README's alone.
        ...folder("samples", "samples", ["**/samples/pictures/**"]),
        ...folder("src/help", "."),
      ],
    }),
  ],
};

const configurations = [functions, pages];
// One after the other: the first also empties dist/.
configurations.parallelism = 1;
export default configurations;
