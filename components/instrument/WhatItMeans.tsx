import { workedExample, type StatedRange } from "./worked-example";

/** The accuracy, worked out for one reading: what people want to know of a data sheet. */
export function WhatItMeans({ ranges }: { ranges: readonly StatedRange[] }) {
  const range = ranges.find(({ unit, fullScale }) => unit === "V" && fullScale >= 5) ?? ranges[0];
  const example = range && workedExample(range);
  if (!example) return null;
  return (
    <div className="mt-4 rounded border-l-4 border-l-rule-strong bg-raised px-3.5 py-2.5 text-[0.9375rem]">
      <p className="font-semibold">What this means for a reading</p>
      <p className="mt-1">
        It shows <Figure>{example.reading}</Figure>. By its maker it may be out by{" "}
        <Figure>{example.limitOfError}</Figure>, which is an expanded uncertainty of{" "}
        <Figure>{example.uncertainty}</Figure> <span className="whitespace-nowrap">(k = 2)</span>.
      </p>
      <p className="mt-1">
        Limits of ± 5 % are <Figure>{example.limits}</Figure>.{" "}
        {example.acceptance ? (
          <>
            Guarded, a reading conforms from <Figure>{example.acceptance}</Figure>; nearer to a limit it conforms inside
            the guard band and is worth repeating with a better instrument.
          </>
        ) : (
          "Guarded, no reading can conform: the guard bands meet. Take a finer range or a better instrument."
        )}
      </p>
      {example.isCoarse && example.acceptance && (
        <p className="mt-1 text-ink-soft">
          That is coarse for such limits: the uncertainty is more than a quarter of the tolerance.
        </p>
      )}
    </div>
  );
}

const Figure = ({ children }: { children: string }) => (
  <span className="mono whitespace-nowrap text-sm">{children}</span>
);
