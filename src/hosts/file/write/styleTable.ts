import { ROLE_LOOKS, type CellRole, type RoleLook } from "../../../sheet/cellLook";
import { escapeXml, HEAD, MAIN } from "./xmlText";

/** Numbers of formats up to here belong to the hosts. */
const FIRST_FORMAT = 164;

/** Collects the styles that cells ask for, and writes them as the part `styles.xml`: each combination of role and number format once. */
export class StyleTable {
  readonly #styles = new Map<string, number>();
  readonly #list: string[] = [];
  readonly #fonts = new Listed();
  readonly #fills = new Listed();
  readonly #borders = new Listed();
  readonly #formats = new Listed();

  constructor() {
    this.#fonts.at(font({}));
    this.#fills.at('<fill><patternFill patternType="none"/></fill>');
    // The format keeps the second place for this one.
    this.#fills.at('<fill><patternFill patternType="gray125"/></fill>');
    this.#borders.at(border({}));
    this.number("plain", undefined);
  }

  /** The number by which a cell names its style. */
  number(role: CellRole, format: string | undefined, own?: RoleLook): number {
    const key = `${role}\n${format ?? ""}\n${own ? JSON.stringify(own) : ""}`;
    let number = this.#styles.get(key);
    if (number === undefined) {
      number = this.#list.length;
      this.#styles.set(key, number);
      this.#list.push(this.#style(role, format, own));
    }
    return number;
  }

  #style(role: CellRole, format: string | undefined, own?: RoleLook): string {
    const look = own ?? ROLE_LOOKS[role];
    const fontAt = this.#fonts.at(font(look));
    const fillAt = look.fill
      ? this.#fills.at(
          `<fill><patternFill patternType="solid"><fgColor rgb="FF${look.fill}"/><bgColor indexed="64"/></patternFill></fill>`,
        )
      : 0;
    const borderAt = this.#borders.at(border(look));
    const formatAt = format === undefined ? 0 : FIRST_FORMAT + this.#formats.at(format);
    const aligned = look.wrap || look.align || role !== "plain";
    const alignment = aligned
      ? `<alignment${look.align ? ` horizontal="${look.align}"` : ""} vertical="top"${look.indent ? ` indent="${look.indent}"` : ""}${look.wrap ? ' wrapText="1"' : ""}/>`
      : "";
    return `<xf numFmtId="${formatAt}" fontId="${fontAt}" fillId="${fillAt}" borderId="${borderAt}" xfId="0"${role === "text" ? ' quotePrefix="1"' : ""} applyNumberFormat="${format ? 1 : 0}" applyFont="1" applyFill="1" applyBorder="1"${aligned ? ' applyAlignment="1"' : ""}>${alignment}</xf>`;
  }

  xml(): string {
    const formats = this.#formats.items.map(
      (code, index) => `<numFmt numFmtId="${FIRST_FORMAT + index}" formatCode="${escapeXml(code)}"/>`,
    );
    const list = (tag: string, items: readonly string[]) =>
      items.length === 0 ? "" : `<${tag} count="${items.length}">${items.join("")}</${tag}>`;
    return `${HEAD}<styleSheet xmlns="${MAIN}">${list("numFmts", formats)}${list("fonts", this.#fonts.items)}${list("fills", this.#fills.items)}${list("borders", this.#borders.items)}<cellStyleXfs count="1"><xf numFmtId="0" fontId="0" fillId="0" borderId="0"/></cellStyleXfs>${list("cellXfs", this.#list)}<cellStyles count="1"><cellStyle name="Normal" xfId="0" builtinId="0"/></cellStyles></styleSheet>`;
  }
}

/** Things that are told by their place in a list, each once. */
class Listed {
  readonly items: string[] = [];
  at(item: string): number {
    const known = this.items.indexOf(item);
    return known >= 0 ? known : this.items.push(item) - 1;
  }
}

function font({ size = 11, bold, italic, ink }: RoleLook): string {
  const colour = ink ? `<color rgb="FF${ink}"/>` : "";
  return `<font>${bold ? "<b/>" : ""}${italic ? "<i/>" : ""}<sz val="${size}"/>${colour}<name val="Calibri"/><family val="2"/></font>`;
}

function border({ rule }: RoleLook): string {
  const side = (name: string) => {
    if (!rule || (rule.side !== "box" && rule.side !== name)) return `<${name}/>`;
    return `<${name} style="${rule.thick ? "medium" : "thin"}"><color rgb="FF${rule.colour}"/></${name}>`;
  };
  return `<border>${["left", "right", "top", "bottom"].map(side).join("")}<diagonal/></border>`;
}
