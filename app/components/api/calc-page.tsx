import { Link } from "react-router";
import { Bob } from "../../ui/bob";
import { Sign } from "../../ui/sign";

type Line = { path: string; type: string; needed: boolean; words: string };
export type CalcWords = {
  name: string;
  title: string;
  summary: string;
  cautions: readonly string[];
  takes: readonly Line[];
  answers: readonly Line[];
  /** Input and output as JSON text. */
  examples: readonly { title: string; input: string; output: string }[];
};

const CODE =
  "overflow-x-auto rounded border border-concrete-200 bg-chalk p-3 font-mono text-[13px] leading-5";

/** Every calculation that can be asked for from outside: what it takes, what it answers, worked examples. */
export function CalcPage({ calcs }: { calcs: readonly CalcWords[] }) {
  return (
    <div className="min-h-dvh bg-concrete-100">
      <header className="flex flex-wrap items-center gap-x-6 gap-y-2 border-concrete-300 border-b bg-chalk px-6 py-3">
        <Link to="/" className="flex items-center gap-2 font-label font-semibold text-2xl no-underline">
          <Bob size={30} /> Plumbay
        </Link>
        <h1 className="font-label text-2xl">Calculations</h1>
        <a className="ml-auto font-medium text-line underline" href="/api/v1/openapi.json">
          Description for programs (OpenAPI 3.1)
        </a>
      </header>
      <div className="mx-auto grid max-w-7xl gap-10 p-6 lg:grid-cols-[14rem_minmax(0,1fr)]">
        <nav aria-label="Calculations" className="lg:sticky lg:top-6 lg:self-start">
          <ul className="grid gap-1">
            {calcs.map((calc) => (
              <li key={calc.name}>
                <a className="flex min-h-9 items-center font-medium text-line" href={`#${calc.name}`}>
                  {calc.title}
                </a>
              </li>
            ))}
          </ul>
        </nav>
        <main className="grid min-w-0 gap-14">
          <HowToAsk first={calcs[0]} />
          {calcs.map((calc) => (
            <OneCalc key={calc.name} calc={calc} />
          ))}
        </main>
      </div>
    </div>
  );
}

function HowToAsk({ first }: { first: CalcWords | undefined }) {
  return (
    <section className="grid max-w-3xl gap-3 text-lg">
      <p>
        Send the figures as JSON to <code>/api/v1/calc/</code> and the calculation's name. Lengths are
        millimetres and angles degrees unless a field says otherwise. Either your browser is signed in, or
        your program shows a token, made under Setup by the owner.
      </p>
      {first ? (
        <pre className={CODE}>
          {`curl -X POST …/api/v1/calc/${first.name} \\\n  -H "Authorization: Bearer plumbay_…" \\\n  -H "Content-Type: application/json" \\\n  --data @input.json`}
        </pre>
      ) : null}
      <p>
        <b className="font-semibold">400</b> names each field that cannot be read;{" "}
        <b className="font-semibold">422</b> says why nothing can come of figures that can;{" "}
        <b className="font-semibold">429</b> asks to wait a minute. The figures are an aid to layout, not an
        engineering certificate.
      </p>
    </section>
  );
}

function OneCalc({ calc }: { calc: CalcWords }) {
  return (
    <section id={calc.name} className="grid min-w-0 scroll-mt-6 gap-4" aria-labelledby={`${calc.name}-head`}>
      <h2
        id={`${calc.name}-head`}
        className="flex flex-wrap items-baseline gap-x-4 border-ink border-b-2 pb-1"
      >
        <span className="font-label font-semibold text-3xl">{calc.title}</span>
        <code className="text-base text-concrete-700">POST /api/v1/calc/{calc.name}</code>
      </h2>
      <p className="max-w-3xl">{calc.summary}</p>
      {calc.cautions.map((words) => (
        <p key={words} className="flex max-w-3xl gap-3">
          <Sign name="caution" size={24} className="flex-none" /> {words}
        </p>
      ))}
      <Fields title="Takes" lines={calc.takes} needs />
      <Fields title="Answers" lines={calc.answers} />
      {calc.examples.map((example) => (
        <details key={example.title} className="border-concrete-200 border-t pt-2">
          <summary className="flex min-h-11 cursor-pointer items-center font-medium">{example.title}</summary>
          <div className="grid min-w-0 gap-4 md:grid-cols-2">
            <pre className={CODE}>{example.input}</pre>
            <pre className={CODE}>{example.output}</pre>
          </div>
        </details>
      ))}
    </section>
  );
}

function Fields({ title, lines, needs = false }: { title: string; lines: readonly Line[]; needs?: boolean }) {
  return (
    <details className="border-concrete-200 border-t pt-2" open={needs}>
      <summary className="flex min-h-11 cursor-pointer items-center">
        <span className="label">
          {title}, {lines.length} fields
        </span>
      </summary>
      <div>
        <table className="w-full text-left text-[15px]">
          <thead>
            <tr className="border-concrete-200 border-b text-concrete-500">
              <th className="py-1 pr-4 font-medium">Field</th>
              <th className="py-1 pr-4 font-medium">Kind</th>
              <th className="py-1 font-medium">What</th>
            </tr>
          </thead>
          <tbody>
            {lines.map((line) => (
              <tr key={`${line.path} ${line.type}`} className="border-concrete-200 border-b align-top">
                <td className="py-1 pr-4">
                  <code className="break-all">{line.path}</code>
                </td>
                <td className="py-1 pr-4 text-concrete-700">{line.type}</td>
                <td className="py-1">
                  {line.words}
                  {needs && !line.needed ? (
                    <span className="text-concrete-500"> (may be left out)</span>
                  ) : null}
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </details>
  );
}
