const EXAMPLE = `{
  "name": "N-21",
  "thicknessPct": 21,
  "note": "where it comes from, what it is for",
  "outline": [[1, 0], [0.5, 0.12], [0, 0], [0.5, -0.09], [1, 0]],
  "polars": [
    {
      "reynolds": 1500000,
      "surfaceState": "clean",
      "source": "wind tunnel, report and year",
      "alphaDeg": [-4, 0, 4, 8, 12],
      "cl": [-0.1, 0.35, 0.8, 1.2, 1.4],
      "cd": [0.009, 0.008, 0.009, 0.012, 0.02],
      "measuredFromDeg": -4,
      "measuredToDeg": 12
    }
  ]
}`;

/** How the file looks, with numbers that are only an example. */
export function FileShape() {
  return (
    <details>
      <summary className="link w-fit cursor-pointer">How the file looks</summary>
      <p className="my-2 max-w-prose text-ink-soft">
        Outline from the trailing edge over the upper side to the nose and back, chord 1. Polars at one or
        more Reynolds numbers, clean or soiled, α ascending. The numbers here are an example, not an airfoil.
      </p>
      <pre tabIndex={0} className="figures m-0 overflow-x-auto bg-panel p-3 text-[13px]">
        {EXAMPLE}
      </pre>
    </details>
  );
}
