/** Names of fields that are never sent back to the page. */
const SECRET = /password|token/i;

/**
 * A form as a plain object. A name that ends in `[]` is always a list and loses the mark; a name that occurs twice
 * becomes a list; React's own fields are left out.
 */
export function readForm(form: FormData): Record<string, unknown> {
  const result: Record<string, unknown> = {};
  for (const name of new Set(form.keys())) {
    if (name.startsWith("$ACTION")) continue;
    const values = form.getAll(name);
    const isList = name.endsWith("[]");
    result[isList ? name.slice(0, -2) : name] = isList || values.length > 1 ? values : values[0];
  }
  return result;
}

/** What the person typed, to be shown again after a fault. Files and secrets are left out. */
export function typedValues(form: FormData): Record<string, string | string[]> {
  const result: Record<string, string | string[]> = {};
  for (const [name, value] of Object.entries(readForm(form))) {
    if (SECRET.test(name)) continue;
    if (typeof value === "string") result[name] = value;
    else if (Array.isArray(value)) result[name] = value.filter((each) => typeof each === "string");
  }
  return result;
}
