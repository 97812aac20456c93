import type { Numbers } from "../numbers";
import type { Texts } from "../texts/en";

/** "F6, F23 and F40", or the first few and how many more. */
export function listed(addresses: readonly string[], texts: Texts, numbers: Numbers, most = 5): string {
  if (addresses.length > most)
    return texts.listMore(addresses.slice(0, most).join(", "), numbers.count(addresses.length - most));
  if (addresses.length < 2) return addresses.join("");
  return texts.listAnd(addresses.slice(0, -1).join(", "), addresses[addresses.length - 1]!);
}
