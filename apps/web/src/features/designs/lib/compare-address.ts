/** A comparison takes two to six. */
export const FEWEST_COMPARED = 2;
export const MOST_COMPARED = 6;

/** Address of the comparison of these versions, the first being what the others are compared with. */
export const compareAddress = (versionIds: readonly string[]): string =>
  `/compare?${new URLSearchParams(versionIds.map((id) => ['v', id])).toString()}`;
