import "server-only";

type Values = { [name: string]: Values | FormDataEntryValue | FormDataEntryValue[] };

/**
 * A FormData as an object. `a.b` nests, `a[]` collects a list, empty strings stay empty strings (the schema
 * decides what they mean) and next's own `$ACTION_…` fields are left out.
 */
export function formValues(form: FormData): Values {
  const values: Values = {};
  for (const name of new Set(form.keys())) {
    if (name.startsWith("$ACTION")) continue;
    const isList = name.endsWith("[]");
    const path = (isList ? name.slice(0, -2) : name).split(".");
    const value = isList ? form.getAll(name) : form.get(name);
    if (value !== null) setAt(values, path, value);
  }
  return values;
}

function setAt(target: Values, path: string[], value: FormDataEntryValue | FormDataEntryValue[]): void {
  const [head, ...rest] = path;
  if (head === undefined || head === "__proto__" || head === "constructor" || head === "prototype") return;
  if (rest.length === 0) {
    target[head] = value;
    return;
  }
  const inner = target[head];
  const next: Values =
    typeof inner === "object" && !Array.isArray(inner) && !(inner instanceof File)
      ? inner
      : // A plain object: it travels back to the form when its values are refused.
        {};
  target[head] = next;
  setAt(next, rest, value);
}
