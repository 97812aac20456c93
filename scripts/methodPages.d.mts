export interface MethodPage {
  readonly file: string;
  readonly title: string;
  readonly functions: readonly string[];
  readonly sections: readonly { readonly heading: string; readonly paragraphs: readonly string[] }[];
}
export function methodPages(): MethodPage[];
