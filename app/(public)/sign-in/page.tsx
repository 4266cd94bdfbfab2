import type { Metadata } from "next";
import { redirect } from "next/navigation";
import { Foot } from "@/components/shell/foot";
import { Wordmark } from "@/components/shell/wordmark";
import { Rule } from "@/components/ui/rule";
import { actorIfSignedIn } from "@/lib/auth/current-actor";
import { database } from "@/lib/database";
import { findOnlyDepartment } from "@/lib/departments/queries";
import { SignInForm } from "./_components/sign-in-form";

export const metadata: Metadata = { title: "Sign in" };

/** The masthead: what this is, a drawn pair of eyes, and the way in. */
export default async function SignInPage({ searchParams }: PageProps<"/sign-in">) {
  if (await actorIfSignedIn()) redirect("/");
  const { next } = await searchParams;
  const notice = await findOnlyDepartment(database());
  return (
    <div className="flex min-h-dvh flex-col">
      <main id="main" tabIndex={-1} className="grow outline-none">
        <header className="flex flex-wrap items-end justify-between gap-x-10 gap-y-3 px-margin pt-7 pb-4.5 lg:px-16">
          <h1>
            <Wordmark className="text-masthead font-normal" />
          </h1>
          <p className="max-w-[26ch] font-serif text-standfirst text-balance text-ink-2 italic lg:text-right">
            Calibration rounds for the corneal light reflex test
          </p>
        </header>
        <Rule />
        <figure>
          <div className="bg-field lg:px-16 lg:py-6.5">
            {/* biome-ignore lint/performance/noImgElement: an optimiser must not resample what is being measured */}
            <img
              src="/sign-in-eyes.jpg"
              width={1600}
              height={560}
              alt="A drawn pair of eyes looking straight at the light; each reflex sits just to the nose side of its pupil centre."
              className="block aspect-[2.86] h-auto w-full object-cover object-[50%_60%]"
            />
          </div>
          <figcaption className="flex flex-wrap justify-between gap-x-8 px-margin pt-3 font-serif lg:px-16">
            <span>Both reflexes lie half a millimetre to the nasal side. The eyes are straight.</span>
            <span className="text-ink-2">Drawn by the Evenglint renderer; no patient is shown.</span>
          </figcaption>
        </figure>
        <div className="grid gap-8 px-margin pt-7 pb-8 lg:grid-cols-[minmax(0,1.7fr)_minmax(0,1fr)_minmax(0,1fr)] lg:gap-0 lg:px-16 [&>section]:lg:border-l [&>section]:lg:border-hair [&>section]:lg:px-10">
          <div className="lg:pr-10">
            <h2 className="mb-3.5 text-h2">Sign in</h2>
            <SignInForm next={typeof next === "string" ? next : undefined} />
          </div>
          <section>
            <h2 className="mb-3.5 text-h2">Read blind</h2>
            <p className="text-ink-2">
              Nobody sees a reference or another person’s reading before the round is released. Until it closes, the
              training lead sees only who has finished how many.
            </p>
          </section>
          {notice?.isDemo && (
            <section>
              <h2 className="mb-3.5 text-h2">{notice.departmentName}</h2>
              <p className="text-ink-2">
                This is the demo. The department, its people and their readings are invented, and all eyes are drawn.
                The sign-ins are printed where the program was started.
              </p>
            </section>
          )}
        </div>
      </main>
      <Foot />
    </div>
  );
}
