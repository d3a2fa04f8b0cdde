import { Card, CardHead } from "@/components/ui/card";
import { Length, Phrase } from "@/components/ui/fraction";
import { Notice } from "@/components/ui/notice";
import { type Fineness, type Unit } from "@/lib/records/types";
import { type SumResult, type SumWorked } from "@/lib/sewing";
import { shownMm } from "@/lib/sums/sum-words";

type Good = SumWorked & { ok: true };

interface Shown {
  unit: Unit;
  fineness: Fineness;
}

function Value({ result, unit, fineness }: Shown & { result: SumResult }) {
  if ("mm" in result) return <Length mm={shownMm(result, unit, fineness)} unit={unit} fineness={fineness} />;
  if ("count" in result) return <span className="figures">{result.count}</span>;
  return "text" in result ? result.text : null;
}

/** The figures to be read at arm's length. */
export function MainFigures({ worked, ...shown }: Shown & { worked: Good }) {
  return (
    <dl className="sum-figures">
      {worked.results
        .filter(({ main }) => main)
        .map((result) => (
          <div key={result.label} className="flex min-w-0 flex-1 basis-24 flex-col-reverse justify-end">
            <dd className="font-figure text-2xl font-bold">
              <Value result={result} {...shown} />
            </dd>
            <dt className="text-fine text-soft">{result.label}</dt>
          </div>
        ))}
    </dl>
  );
}

/** Everything that a sum comes to: all figures, the marks, what to do, and what to mind. */
export function SumResults({ worked, ...shown }: Shown & { worked: Good }) {
  const figures = worked.results.filter((result) => !("marks" in result));
  const marked = worked.results.flatMap((result) => ("marks" in result ? [result] : []));
  return (
    <>
      {worked.cautions.map((caution, i) => (
        <Notice key={i} tone="look" title={<Phrase parts={[...caution.say]} {...shown} />}>
          <p className="text-sm text-soft">Source: {caution.source}.</p>
        </Notice>
      ))}
      <Card aria-labelledby="sum-figures">
        <CardHead id="sum-figures" title="It comes to" />
        <dl className="grid">
          {figures.map((result) => (
            <div
              key={result.label}
              className="flex flex-wrap items-baseline justify-between gap-x-3 border-b border-line py-1 last:border-b-0"
            >
              <dt>{result.label}</dt>
              <dd className="ms-auto font-semibold">
                <Value result={result} {...shown} />
              </dd>
            </div>
          ))}
        </dl>
      </Card>
      {marked.map((result) => (
        <Marks key={result.label} result={result} {...shown} />
      ))}
      <Card aria-labelledby="sum-steps">
        <CardHead id="sum-steps" title="What to do" />
        <ol className="grid list-decimal gap-2 ps-6">
          {worked.steps.map((step, i) => (
            <li key={i}>
              <Phrase parts={[...step]} {...shown} />
            </li>
          ))}
        </ol>
      </Card>
    </>
  );
}

function Marks({
  result,
  ...shown
}: Shown & { result: SumResult & { marks: readonly { name: string; mm: number }[]; from: string } }) {
  return (
    <Card aria-label={result.label}>
      <CardHead title={result.label} sub={`Measured from ${result.from}.`} />
      <ol className="grid">
        {result.marks.map(({ mm, name }) => (
          <li
            key={name}
            className="flex items-baseline justify-between gap-3 border-b border-line py-1 last:border-b-0"
          >
            <span>{name}</span>
            <span className="text-lg font-semibold">
              <Length mm={mm} {...shown} />
            </span>
          </li>
        ))}
      </ol>
    </Card>
  );
}
