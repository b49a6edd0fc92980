import { LinkButton } from "@/components/ui/link-button";
import { SampleStep } from "@/components/front/sample-step";

const WHO = [
  {
    who: "At the engine",
    what: "Say what it does in your own words. One step a screen, cautions first, to the cause and a cure that is proved. Once open, it goes on without a signal.",
  },
  {
    who: "Ashore",
    what: "A mechanic keeps the fault tree those questions come from, and reads every diagnosis step by step: asked, answered, believed then.",
  },
  {
    who: "Who pays",
    what: "Every repair is logged against engine hours. When a fault comes back on the same engine, it says so, and what lies upstream.",
  },
];

export default function FrontPage() {
  return (
    <div className="grid gap-8 lg:grid-cols-[1fr_24rem] lg:gap-14">
      <div>
        <h1 className="max-w-xl text-3xl sm:text-[2.75rem] sm:leading-[1.08]">Find the fault, prove the fix, know when it is back.</h1>
        <p className="mt-4 max-w-xl text-lg">
          Gudgeon leads you through the right checks in the right order when a small boat’s diesel is slow to start or will not reach its
          revs, with what is aboard, and without making things worse.
        </p>
        <div className="mt-6 flex flex-wrap gap-3">
          <LinkButton href="/sign-up" tone="strong" size="large">
            Start with your boat
          </LinkButton>
          <LinkButton href="/sign-in" size="large">
            Sign in
          </LinkButton>
        </div>
        <ul className="mt-8 grid max-w-2xl gap-4">
          {WHO.map(({ who, what }) => (
            <li key={who} className="border-l-4 border-fill pl-3">
              <b>{who}.</b> {what}
            </li>
          ))}
        </ul>
      </div>
      <SampleStep />
    </div>
  );
}
