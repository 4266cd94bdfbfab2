"use client";
import { Lock, Printer, WifiOff, ZoomIn } from "lucide-react";
import { useState } from "react";
import { Foot } from "@/components/shell/foot";
import { Mark } from "@/components/shell/mark";
import { Page, PageHead } from "@/components/shell/page";
import { PersonMenu } from "@/components/shell/person-menu";
import { RunningHead } from "@/components/shell/running-head";
import { Wordmark } from "@/components/shell/wordmark";
import { Button, ButtonLink } from "@/components/ui/button";
import { Checkbox } from "@/components/ui/checkbox";
import { ChoiceGroup } from "@/components/ui/choice-group";
import { ConfirmDialog } from "@/components/ui/confirm-dialog";
import { Crumb } from "@/components/ui/crumb";
import { DataTable } from "@/components/ui/data-table";
import { DefinitionList, FactRow } from "@/components/ui/definition-list";
import { EmptyState } from "@/components/ui/empty-state";
import { Field } from "@/components/ui/field";
import { Figure } from "@/components/ui/figure";
import { FilterChip, FilterChipLink, FilterChips } from "@/components/ui/filter-chips";
import { MenuButton, MenuLink, MenuSection } from "@/components/ui/menu-items";
import { Notice, Remark } from "@/components/ui/notice";
import { Photograph } from "@/components/ui/photograph";
import { PhotographThumb } from "@/components/ui/photograph-thumb";
import { ProgressRule } from "@/components/ui/progress-rule";
import { Segments } from "@/components/ui/segments";
import { Select } from "@/components/ui/select";
import { Sheet } from "@/components/ui/sheet";
import { Skeleton, SkeletonBlock, SkeletonLine } from "@/components/ui/skeleton";
import { Standfirst } from "@/components/ui/standfirst";
import { Tag } from "@/components/ui/tag";
import { TextInput } from "@/components/ui/text-input";
import { Textarea } from "@/components/ui/textarea";
import { Time } from "@/components/ui/time";

const REASONS = [
  "Lids or lashes hide the reflex",
  "Out of focus or shaken",
  "Not looking at the light",
  "More than one reflex",
  "No reflex to be seen",
  "Something else, I will write it",
];
const S = "border-t-2 border-ink pt-3";
const img = "/api-none/kit.jpg";

export default function Kit() {
  const [open, setOpen] = useState(false);
  const [eye, setEye] = useState<"right" | "left" | "none" | null>("left");
  const [chips, setChips] = useState<string[]>(["eso"]);
  return (
    <>
      <RunningHead
        homeHref="/"
        items={[
          { label: "Desk", href: "/desk" },
          { label: "Rounds", href: "/cautions/kit" },
          { label: "Case library", href: "/cases" },
          { label: "Examiners", href: "/examiners" },
          { label: "Drift", href: "/drift" },
        ]}
        person={
          <PersonMenu
            name="Ines Farrowby"
            place="Training lead · Quillmere Eye Department"
            signOut={
              <form>
                <MenuButton>Sign out</MenuButton>
              </form>
            }
          >
            <MenuSection title="Department and role">
              <MenuButton isCurrent detail="Training lead">
                Quillmere Eye Department
              </MenuButton>
              <MenuButton detail="Examiner">Quillmere Eye Department</MenuButton>
            </MenuSection>
            <MenuSection>
              <MenuLink href="/cautions/kit">Account</MenuLink>
            </MenuSection>
          </PersonMenu>
        }
      />
      <Page>
        <PageHead
          crumb={<Crumb steps={[{ label: "Rounds", href: "/cautions/kit" }, { label: "Round 12" }]} />}
          title="Parts and states"
          lede={
            <>
              Open for reading. Closes <Time iso="2026-03-14T17:00:00Z" zone="Europe/Madrid" showsZone />.
            </>
          }
          actions={
            <>
              <Mark className="h-11 w-24" />
              <Wordmark className="text-[46px] leading-none tracking-[-.02em]" />
              <ButtonLink href="/cautions/kit" icon={Printer}>
                Print report
              </ButtonLink>
            </>
          }
        />
        <div className="grid gap-x-8 gap-y-10 lg:grid-cols-12 [&>section>h2]:mb-4 [&>section>h2]:text-[20px]">
          <section className={`${S} lg:col-span-12`}>
            <h2>Type</h2>
            <Standfirst isRuled>
              Agreement with the reference was good: median kappa <b>0.86</b>, from 0.52 to 0.95. <i>Readings ran</i>{" "}
              +1.1° above; 30° is 58 Δ <i>and 14 Δ</i>.
            </Standfirst>
            <p id="delta-sans">
              Sans 58 Δ, <b>58 Δ</b>, −9.7°
            </p>
            <p id="delta-mono" className="font-mono">
              Mono 58 Δ 3.3 mm
            </p>
            <p id="delta-serif" className="font-serif">
              Serif 58 Δ
            </p>
            <p>
              <i>Italic sans Δ</i>
            </p>
            <FactRow
              items={[
                { term: "cases", detail: "24" },
                { term: "examiners, all finished", detail: "11" },
                { term: "readings", detail: "264" },
                { term: "open for reading", detail: "1 Mar – 14 Mar" },
              ]}
            />
          </section>
          <section className={`${S} lg:col-span-4`}>
            <h2>Buttons</h2>
            <div className="flex flex-wrap gap-2.5">
              <Button kind="main">Publish round</Button>
              <Button>Print report</Button>
              <Button kind="bare">Add a note</Button>
              <Button kind="stop">Withdraw case</Button>
              <Button disabled>Close round</Button>
              <Button size="slim">Remind</Button>
              <Button kind="main" isBusy>
                Sending
              </Button>
              <Button size="desk" kind="main" icon={ZoomIn}>
                Commit, next case
              </Button>
            </div>
            <div className="mt-4 flex flex-wrap gap-2">
              <Tag tone="ok">finished</Tag>
              <Tag tone="warn">beyond warning</Tag>
              <Tag tone="bad">beyond action</Tag>
              <Tag tone="info">reference</Tag>
              <Tag tone="own">you</Tag>
              <Tag tone="mute" icon={Lock}>
                sealed
              </Tag>
            </div>
          </section>
          <section className={`${S} lg:col-span-4`}>
            <h2>Choices</h2>
            <ChoiceGroup
              legend="Which eye deviates?"
              legendLook="question"
              name="eye"
              value={eye}
              onChange={setEye}
              choices={[
                { value: "right", label: "Right", shortcut: "R" },
                { value: "left", label: "Left", shortcut: "L", detail: "turned out" },
                { value: "none", label: "Neither", isDisabled: true },
              ]}
            />
            <FilterChips label="Direction" className="mt-5">
              {["eso", "exo", "hyper"].map((c) => (
                <FilterChip
                  key={c}
                  label={c}
                  count={4}
                  isOn={chips.includes(c)}
                  onToggle={() => setChips(chips.includes(c) ? chips.filter((x) => x !== c) : [...chips, c])}
                />
              ))}
              <FilterChipLink href="/cautions/kit?x=1" label="open" isOn={false} />
            </FilterChips>
            <div className="mt-4">
              <Segments
                label="Measure"
                items={[
                  { label: "Kappa", href: "/cautions/kit", isCurrent: true },
                  { label: "Bias", href: "/cautions/kit?b", isCurrent: false },
                ]}
              />
            </div>
          </section>
          <section className={`${S} lg:col-span-4`}>
            <h2>Fields</h2>
            <Field label="Closes" hint="Examiners in other time zones see their own time.">
              {(w) => <TextInput {...w} defaultValue="14 September" />}
            </Field>
            <Field label="Degrees" error="Degrees go from 1 to 45. Did you mean 30?" className="mt-4">
              {(w) => <TextInput {...w} defaultValue="300" isMeasured unit="°" />}
            </Field>
            <Field label="Role" className="mt-4">
              {(w) => (
                <Select
                  {...w}
                  options={[
                    { value: "a", label: "Examiner" },
                    { value: "b", label: "Trainee" },
                  ]}
                />
              )}
            </Field>
            <Field label="Note" isOptional className="mt-4">
              {(w) => <Textarea {...w} placeholder="What you saw" />}
            </Field>
            <Checkbox label="Consent is noted" hint="For this use, in writing." defaultChecked />
            <Checkbox label="Hidden repeats" />
            <Checkbox label="Disabled" disabled />
          </section>
          <section className={`${S} lg:col-span-4`}>
            <h2>Loading</h2>
            <Skeleton label="Loading case 11" slow="Still fetching case 11. The reading you committed is safe.">
              <SkeletonBlock />
              <SkeletonLine className="w-[92%]" />
              <SkeletonLine className="w-[64%]" />
            </Skeleton>
          </section>
          <section className={`${S} lg:col-span-4`}>
            <h2>Nothing here yet</h2>
            <EmptyState title="No round is open" level={3} action={<Button>Practise</Button>}>
              You will find the next one here on 1 September. Until then, practise on cases of earlier rounds.
            </EmptyState>
          </section>
          <section className={`${S} lg:col-span-4`}>
            <h2>Definition list</h2>
            <Sheet>
              <DefinitionList
                items={[
                  { term: "Convention", detail: "landmark rule" },
                  { term: "Cases", detail: <span className="font-mono">24</span> },
                  {
                    term: "A longer term",
                    detail: "A longer detail that wraps over more than one line in this narrow sheet",
                  },
                ]}
              />
            </Sheet>
          </section>
          <section className={`${S} lg:col-span-6`}>
            <h2>News from the line</h2>
            <div className="grid gap-2.5">
              <Notice tone="warn" icon={WifiOff} title="Off line.">
                Go on reading: 3 readings are kept on this tablet and go out when the line is back.
              </Notice>
              <Notice tone="bad" title="Case 11 did not arrive." action={<Button size="slim">Try again</Button>}>
                Your other readings are safe.
              </Notice>
              <Notice tone="ok" title="Round sent.">
                24 readings, 14 March 16:20. The scores open when the round is released.
              </Notice>
              <Notice tone="info" title="Results were computed on the landmark rule.">
                Other conventions are not pooled.
              </Notice>
              <Remark tone="warn">
                <b>Changed since you looked.</b> Devraj Mintern also marked this case. <a href="#x">Compare both</a>
              </Remark>
            </div>
          </section>
          <section className={`${S} lg:col-span-6`}>
            <h2>Not readable: why?</h2>
            <ChoiceGroup
              legend="Reason"
              legendLook="hidden"
              name="reason"
              layout="rows"
              columns={2}
              defaultValue="0"
              choices={REASONS.map((label, i) => ({ value: String(i), label }))}
            />
            <Button className="mt-6" onClick={() => setOpen(true)}>
              Open dialog
            </Button>
            <ConfirmDialog
              isOpen={open}
              title="Close round 12 and release it?"
              consequences={[
                "245 of 312 readings will count.",
                "Six examiners who have not finished will get no kappa.",
              ]}
              typed={{ label: "Type the number of the round", word: "12" }}
              keepLabel="Keep it open"
              actLabel="Close and release"
              onKeep={() => setOpen(false)}
              onAct={() => setOpen(false)}
            >
              Everybody will see references, readings and scores at once. This cannot be taken back.
            </ConfirmDialog>
          </section>
          <section className={`${S} lg:col-span-12`}>
            <h2>Progress</h2>
            <div className="-mx-(--page-margin)">
              <ProgressRule label="Cases read" count={24} done={9} current={10} className="px-margin" />
            </div>
            <div className="mt-8">
              <ProgressRule
                label="Days"
                count={14}
                done={12}
                current={13}
                isFilled
                labels={[
                  "1 Mar",
                  "2",
                  "3",
                  "4",
                  "5",
                  "6",
                  "7",
                  "8",
                  "9",
                  "10",
                  "11",
                  "12",
                  "13",
                  "closes 14 Mar 18:00",
                ].map((t, i) => (i % 3 === 0 || i === 13 ? t : null))}
              />
            </div>
          </section>
          <section className={`${S} lg:col-span-8`}>
            <DataTable
              label="Table 1"
              caption="Readings by examiner. Order of cases differs from examiner to examiner."
              initialSort={{ key: "in", direction: "descending" }}
              columns={[
                { key: "name", head: "Examiner", isSortable: true },
                { key: "in", head: "In", isNumeric: true, isSortable: true },
                { key: "last", head: "Last reading" },
                { key: "state", head: "State", isHeadHidden: true, phone: "end", className: "sm:text-right" },
              ]}
              rows={[
                [
                  "Adaeze Winmarsh",
                  24,
                  "9 Mar",
                  <Tag key="t" tone="ok">
                    finished
                  </Tag>,
                ],
                ["Sanna Hollowick", 22, "today 08:51", "reading"],
                [
                  "Callum Orrish",
                  0,
                  "never",
                  <Button key="b" size="slim">
                    Remind
                  </Button>,
                ],
                [
                  "Noor Ashgrove with a much longer name than usual",
                  null,
                  "5 Mar",
                  <Tag key="t" tone="warn">
                    not begun
                  </Tag>,
                ],
              ].map(([name, n, last, state], i) => ({
                id: String(i),
                isOwn: i === 1,
                cells: { name, in: n ?? "too few", last, state },
                sortValues: { name: String(name), in: typeof n === "number" ? n : null },
              }))}
            />
            <div className="mt-10">
              <DataTable
                caption="Nothing"
                columns={[
                  { key: "a", head: "A" },
                  { key: "b", head: "B" },
                ]}
                rows={[]}
                empty="No readings yet."
              />
            </div>
          </section>
          <section className={`${S} lg:col-span-4`}>
            <Figure
              label="Fig. 1"
              caption="Agreement with the reference on eye and direction, by examiner. Dot: Cohen’s kappa; bar: 95% confidence interval."
              table={
                <DataTable
                  caption="Kappa by examiner"
                  isCaptionHidden
                  columns={[
                    { key: "a", head: "Examiner" },
                    { key: "b", head: "kappa", isNumeric: true },
                  ]}
                  rows={[{ id: "1", cells: { a: "Adaeze", b: "0.95" } }]}
                />
              }
            >
              <div className="h-40 bg-sunk" />
            </Figure>
          </section>
          <section className="lg:col-span-12">
            <Photograph src={img} width={1800} height={1000} alt="Case 14, photograph of both eyes, reading exercise" />
            <div className="mt-4 grid grid-cols-2 gap-3.5 sm:grid-cols-4">
              <PhotographThumb src={img} width={1800} height={1000} alt="Case 14" />
              <PhotographThumb src={img} width={1800} height={1000} alt="Case 15" />
            </div>
          </section>
        </div>
      </Page>
      <Foot />
    </>
  );
}
