import { readXml } from "./readXml";
import type { ZipArchive } from "./zipArchive";

/** Which numbers in a cell's `cm` mark a formula that spills by itself (ECMA-376 cell metadata, the kind named XLDAPR). */
export function readDynamicMarks(archive: ZipArchive, part: string | undefined): ReadonlySet<number> {
  const marks = new Set<number>();
  if (part === undefined) return marks;
  const kinds: string[] = [];
  const dynamic = new Set<number>();
  let list = "";
  let index = 0;
  readXml(archive, part, {
    open(name, attributes) {
      if (name === "metadataType") kinds.push(attributes["name"] ?? "");
      else if (name === "cellMetadata") [list, index] = ["cells", 0];
      else if (name === "futureMetadata") [list, index] = [attributes["name"] ?? "", 0];
      else if (name === "bk") index++;
      else if (name === "dynamicArrayProperties" && list === "XLDAPR" && attributes["fDynamic"] !== "0")
        dynamic.add(index - 1);
      else if (name === "rc" && list === "cells") {
        if (kinds[Number(attributes["t"]) - 1] === "XLDAPR" && dynamic.has(Number(attributes["v"]))) marks.add(index);
      }
    },
  });
  return marks;
}
