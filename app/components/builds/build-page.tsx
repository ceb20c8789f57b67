import { Link, useSearchParams } from "react-router";
import { VEHICLE_KIND } from "../../domain/builds/vehicle-kinds";
import { formatFeet, mm } from "../../domain/units/length";
import { buttonClass } from "../../ui/button";
import { Sign } from "../../ui/sign";
import { Tape } from "../../ui/tape";
import { spanInWords, whenInWords } from "../time";
import { VehiclePlan } from "../vehicle-plan";
import { AskedFor } from "./asked-for";
import type { BuildPageProps } from "./build-view";
import { StageLine } from "./stage-line";
import { Standing } from "./standing";
import { Story } from "./story";

/** One build: the vehicle, where it stands, what was asked for, its stages and its story. */
export function BuildPage(props: BuildPageProps) {
  const { build, customer, stages, standing, story, now, timeZone, unit } = props;
  return (
    <main className="mx-auto grid w-full max-w-[88rem] content-start gap-6 p-4 sm:p-6">
      <JustBookedIn build={build} mayPrint={props.mayPrint} />
      <Head {...props} />
      <div className="grid gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,1fr)_24rem]">
        <div className="grid content-start gap-8">
          <Standing {...props} />
          <section aria-labelledby="stages-head" className="grid gap-3">
            <h2 id="stages-head" className="label">
              Stages
            </h2>
            <StageLine stages={stages} crew={standing?.crew ?? []} now={now} timeZone={timeZone} />
          </section>
        </div>
        <div className="grid content-start gap-8">
          <AskedFor
            wanted={build.wanted}
            asked={build.asked}
            unit={unit}
            putRight={props.mayChange ? `/builds/${build.id}/asked` : null}
          />
          {customer ? <CustomerNote customer={customer} /> : null}
          <Story rows={story} now={now} timeZone={timeZone} />
        </div>
      </div>
    </main>
  );
}

function Head({ build, mayPrint, now, timeZone }: BuildPageProps) {
  const late = build.promisedAt !== null && build.state === "here" && build.promisedAt < now;
  return (
    <header className="flex flex-wrap items-end justify-between gap-x-8 gap-y-4 border-concrete-300 border-b pb-5">
      <div className="flex min-w-0 flex-wrap items-end gap-x-8 gap-y-3">
        <VehiclePlan
          kind={build.kind}
          lengthMm={build.lengthMm}
          widthMm={build.widthMm}
          scale={Math.min(230 / build.lengthMm, 96 / build.widthMm)}
        />
        <div className="grid gap-1">
          <h1>
            <Tape name={build.nickname} code={build.code} size="l" />
          </h1>
          <p className="text-concrete-700">
            {VEHICLE_KIND[build.kind].label}, {formatFeet(mm(build.lengthMm))} long,{" "}
            {formatFeet(mm(build.widthMm))} wide
          </p>
        </div>
      </div>
      <div className="flex flex-wrap items-center gap-x-6 gap-y-2">
        <p className={late ? "flex items-center gap-2 font-medium text-oxide" : "flex items-center gap-2"}>
          <Sign name="promise" />
          {build.promisedAt === null ? (
            "No promise given"
          ) : (
            <>
              Promised {whenInWords(build.promisedAt, now, timeZone)}
              {late ? `, ${spanInWords(Date.parse(now) - Date.parse(build.promisedAt))} late` : ""}
            </>
          )}
        </p>
        {mayPrint ? (
          <Link to={`/builds/${build.id}/tag`} className={buttonClass("plain", "m")}>
            <Sign name="scan-tag" /> Tag {build.code}
          </Link>
        ) : null}
      </div>
    </header>
  );
}

/** Said once, right after booking in: the tag is what comes next. */
function JustBookedIn({ build, mayPrint }: { build: BuildPageProps["build"]; mayPrint: boolean }) {
  const [params] = useSearchParams();
  if (!params.has("booked-in")) return null;
  return (
    <p
      role="status"
      className="flex flex-wrap items-center gap-x-4 gap-y-2 border-moss border-l-4 bg-moss-wash px-4 py-3"
    >
      <span>
        <b className="font-semibold">{build.nickname} is booked in</b> and stands in the yard. Its tag is{" "}
        {build.code}: print it and hang it on.
      </span>
      {mayPrint ? (
        <Link to={`/builds/${build.id}/tag`} className={buttonClass("go", "m")}>
          Print the tag
        </Link>
      ) : null}
    </p>
  );
}

function CustomerNote({ customer }: { customer: { name: string; phone: string; email: string } }) {
  return (
    <section aria-labelledby="customer-head" className="grid gap-1">
      <h2 id="customer-head" className="label">
        Customer
      </h2>
      <p className="font-semibold text-lg">{customer.name}</p>
      {customer.phone ? (
        <a
          href={`tel:${customer.phone.replace(/[^\d+]/g, "")}`}
          className="inline-flex min-h-11 items-center text-line underline"
        >
          {customer.phone}
        </a>
      ) : null}
      {customer.email ? (
        <a
          href={`mailto:${customer.email}`}
          className="inline-flex min-h-11 items-center break-all text-line underline"
        >
          {customer.email}
        </a>
      ) : null}
      {customer.phone || customer.email ? null : (
        <p className="text-concrete-700">No number or address given.</p>
      )}
    </section>
  );
}
