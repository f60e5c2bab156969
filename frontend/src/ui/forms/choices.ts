/** Choices of a record of labels, in its order. */
export function choicesOf<T extends string>(
  labels: Record<T, string>,
  values?: readonly T[],
): { value: T; label: string }[] {
  return (values ?? (Object.keys(labels) as T[])).map((value) => ({ value, label: labels[value] }));
}
