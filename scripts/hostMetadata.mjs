// The table of functions as the metadata that Excel reads (custom functions, runtime 1.1).

/** @param {import("../src/sheet/functionTable").FunctionEntry[]} table */
export function hostMetadata(table, origin) {
  return {
    $schema: "https://developer.microsoft.com/json-schemas/office-js/custom-functions.schema.json",
    // Without it a range with one error cell fails as a whole, before the function could say which cell it is.
    allowErrorForDataTypeAny: true,
    functions: table.map((entry) => ({
      id: entry.name,
      name: entry.name,
      description: entry.description,
      helpUrl: `${origin}/${entry.helpPath}`,
      parameters: entry.parameters.map(({ name, description, dimensionality, optional }) => ({
        name,
        description,
        type: "any",
        dimensionality,
        ...(optional && { optional }),
      })),
      result: { type: "any", dimensionality: entry.result },
      ...(entry.takesAddresses && { options: { requiresParameterAddresses: true } }),
    })),
  };
}
