import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { describe, expect, test } from "vitest";
import { allElements, elementsNamed, parseXml } from "../support/xml";

/*
 * Offline checks of what Excel would refuse: there is no validator on this side of the network. The order of elements and the lengths
 * are those of Microsoft's documentation of the add-in manifest (learn.microsoft.com/office/dev/add-ins/develop/xml-manifest-overview).
 */
const project = join(__dirname, "../..");
const manifest = parseXml(readFileSync(join(project, "manifest/manifest.xml"), "utf8"));
const dist = join(project, "dist");
const ids = (name: string) => elementsNamed(manifest, name).map((element) => element.attributes.id!);
const names = (parent: string) => elementsNamed(manifest, parent)[0]!.children.map((child) => child.name);

describe("manifest.xml", () => {
  test("keeps the order of elements that the host asks for", () => {
    expect(manifest.name).toBe("OfficeApp");
    expect(manifest.children.map((child) => child.name)).toEqual(
      "Id Version ProviderName DefaultLocale DisplayName Description IconUrl HighResolutionIconUrl SupportUrl AppDomains Hosts Requirements DefaultSettings Permissions VersionOverrides".split(
        " ",
      ),
    );
    expect(names("VersionOverrides")).toEqual(["Hosts", "Resources"]);
    const host = elementsNamed(manifest, "VersionOverrides")[0]!.children[0]!.children[0]!;
    expect(host.children.map((child) => child.name)).toEqual(["Runtimes", "AllFormFactors", "DesktopFormFactor"]);
    expect(names("DesktopFormFactor")).toEqual(["GetStarted", "FunctionFile", "ExtensionPoint"]);
    expect(names("AllFormFactors")).toEqual(["ExtensionPoint"]);
    expect(elementsNamed(manifest, "AllFormFactors")[0]!.children[0]!.children.map((child) => child.name)).toEqual([
      "Script",
      "Page",
      "Metadata",
      "Namespace",
    ]);
    expect(names("Resources")).toEqual(["bt:Images", "bt:Urls", "bt:ShortStrings", "bt:LongStrings"]);
    expect(names("Control")).toEqual(["Label", "Supertip", "Icon", "Action"]);
  });

  test("has a GUID and a version of four parts, the package's version in front", () => {
    const [id, version] = manifest.children.map((child) => child.text);
    expect(id).toMatch(/^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/);
    const { version: ours } = JSON.parse(readFileSync(join(project, "package.json"), "utf8")) as { version: string };
    expect(version).toBe(`${ours}.0`);
  });

  test("resolves every resource id, of at most 32 characters, each defined once and used", () => {
    const defined = ["bt:Image", "bt:Url", "bt:String"].flatMap(ids).filter(Boolean);
    const used = allElements(manifest).flatMap(({ attributes }) => (attributes.resid ? [attributes.resid] : []));
    expect(new Set(defined).size).toBe(defined.length);
    expect([...new Set(used)].sort()).toEqual([...defined].sort());
    for (const id of defined) expect(id.length).toBeLessThanOrEqual(32);
  });

  test("keeps texts within the host's lengths", () => {
    const texts = (group: string) =>
      elementsNamed(manifest, group)[0]!.children.map((child) => child.attributes.DefaultValue!);
    for (const text of texts("bt:ShortStrings")) expect(text.length).toBeLessThanOrEqual(125);
    for (const text of texts("bt:LongStrings")) expect(text.length).toBeLessThanOrEqual(250);
    expect(elementsNamed(manifest, "DisplayName")[0]!.attributes.DefaultValue!.length).toBeLessThanOrEqual(125);
    expect(elementsNamed(manifest, "Description")[0]!.attributes.DefaultValue!.length).toBeLessThanOrEqual(250);
  });

  test("shares one runtime: page, functions and button point to the same page, kept alive", () => {
    const runtime = elementsNamed(manifest, "Runtime")[0]!.attributes;
    expect(runtime.lifetime).toBe("long");
    const page = elementsNamed(manifest, "Page")[0]!.children[0]!.attributes.resid;
    const button = elementsNamed(manifest, "Action")[0]!.children.find((child) => child.name === "SourceLocation")!;
    expect([page, elementsNamed(manifest, "FunctionFile")[0]!.attributes.resid, button.attributes.resid]).toEqual(
      Array(3).fill(runtime.resid),
    );
  });

  test("names https addresses only, each of a file that the build makes", () => {
    const urls = allElements(manifest).flatMap(({ attributes }) =>
      Object.values(attributes).filter((value) => value.includes("//localhost")),
    );
    expect(urls.length).toBeGreaterThan(8);
    for (const url of urls) {
      expect(url).toMatch(/^https:\/\/localhost:3000\//);
      expect(existsSync(join(dist, new URL(url).pathname)), `${url} in dist`).toBe(true);
    }
  });

  test("asks for icons of the sizes that they have", () => {
    const sized: [number, string][] = [
      [32, elementsNamed(manifest, "IconUrl")[0]!.attributes.DefaultValue!],
      [64, elementsNamed(manifest, "HighResolutionIconUrl")[0]!.attributes.DefaultValue!],
    ];
    const urlOf = (id: string) =>
      elementsNamed(manifest, "bt:Image").find((image) => image.attributes.id === id)!.attributes.DefaultValue!;
    for (const { attributes } of elementsNamed(manifest, "bt:Image"))
      if (attributes.size) sized.push([Number(attributes.size), urlOf(attributes.resid!)]);
    expect(sized.length).toBe(8);
    for (const [size, url] of sized) {
      const png = readFileSync(join(project, "manifest", new URL(url).pathname));
      expect([png.readUInt32BE(16), png.readUInt32BE(20)], url).toEqual([size, size]);
    }
  });

  test("names the namespace that the formulas of every example use", () => {
    const namespace = elementsNamed(manifest, "bt:String").find(
      ({ attributes }) => attributes.id === "Functions.Namespace",
    )!;
    expect(namespace.attributes.DefaultValue).toBe("WEIR");
    const table = JSON.parse(readFileSync(join(project, "src/functions/functions.json"), "utf8")) as {
      examples: { formula: string }[];
    }[];
    for (const { examples } of table) for (const { formula } of examples) expect(formula).toMatch(/^=WEIR\./);
  });

  test("the metadata in the build describes the functions of the table, with what the host needs to hand over error cells", () => {
    const metadata = JSON.parse(readFileSync(join(dist, "functions.json"), "utf8")) as {
      functions: { id: string; name: string; helpUrl: string; parameters: { name: string }[]; options?: object }[];
      allowErrorForDataTypeAny?: boolean;
    };
    const table = JSON.parse(readFileSync(join(project, "src/functions/functions.json"), "utf8")) as { name: string }[];
    expect(metadata.functions.map(({ id }) => id)).toEqual(table.map(({ name }) => name));
    for (const { id, name, helpUrl } of metadata.functions) {
      expect(name).toBe(id);
      expect(helpUrl).toBe(`https://localhost:3000/help/${id}.html`);
      expect(existsSync(join(dist, `help/${id}.html`))).toBe(true);
    }
    expect(JSON.stringify(metadata)).toContain('"allowErrorForDataTypeAny":true');
  });
});
