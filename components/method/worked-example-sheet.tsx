import { joinClasses } from "@/components/ui/join-classes";
import { Sheet } from "@/components/ui/sheet";
import { formatFigure, type WorkedExample, type WorkedFigure } from "@/lib/method/worked-example";
import { ExampleTable } from "./example-table";

/** An example beside its formula: the published data, what the program makes of them, and what was printed. */
export function WorkedExampleSheet({ example }: { example: WorkedExample }) {
  const { data, tables = [], figures = [], note } = example;
  return (
    <Sheet className="grid grid-cols-[minmax(0,1fr)] gap-3.5 self-start text-table">
      <h4 className="font-semibold">Worked example</h4>
      <p className="text-small text-ink-2">{data}</p>
      {tables.map((table) => (
        <ExampleTable key={table.caption} table={table} />
      ))}
      {figures.length > 0 && <Figures figures={figures} />}
      {note && <p className="text-small text-ink-2">{note}</p>}
    </Sheet>
  );
}

function Figures({ figures }: { figures: readonly WorkedFigure[] }) {
  const isHeld = figures.some(({ printed, recomputed }) => printed !== undefined || recomputed !== undefined);
  return (
    <table className="w-full border-collapse">
      <caption className="sr-only">Figures computed on this page, and what they are held against</caption>
      <thead>
        <tr className="border-b border-ink text-small text-ink-2">
          <th scope="col" className="pb-1.5 text-left font-medium">
            Figure
          </th>
          <th scope="col" className="pb-1.5 pl-3 text-right font-medium">
            Computed
          </th>
          {isHeld && (
            <th scope="col" className="pb-1.5 pl-3 text-right font-medium">
              Printed
            </th>
          )}
        </tr>
      </thead>
      <tbody>
        {figures.map((figure) => (
          <tr key={figure.label} className="border-b border-hair align-baseline last:border-b-0">
            <th scope="row" className="py-1.5 text-left font-normal">
              {figure.label}
            </th>
            <td className={joinClasses(NUMBER, "sm:whitespace-nowrap")}>{formatFigure(figure.value, figure.digits)}</td>
            {isHeld && (
              <td className={joinClasses(NUMBER, "text-ink-2")}>
                <HeldAgainst figure={figure} />
              </td>
            )}
          </tr>
        ))}
      </tbody>
    </table>
  );
}

const NUMBER = "py-1.5 pl-3 text-right font-mono";
const NO_NUMBER = "font-sans text-small";

function HeldAgainst({ figure: { printed, recomputed, digits } }: { figure: WorkedFigure }) {
  if (printed !== undefined) return formatFigure(printed, digits);
  if (recomputed === undefined) return <span className={NO_NUMBER}>none</span>;
  return (
    <>
      <span className="sm:whitespace-nowrap">{formatFigure(recomputed, digits)}</span>{" "}
      <span className={NO_NUMBER}>recomputed</span>
    </>
  );
}
