import { DataTable } from "@/components/ui/data-table";
import type { TableColumn } from "@/components/ui/table-types";
import type { ExaminerFigures, RoundResults } from "@/lib/results/schema";
import { BiasText, KappaText, LimitsText, ShareText } from "./figure-text";

const COLUMNS: TableColumn[] = [
  { key: "name", head: "Examiner", isSortable: true },
  { key: "n", head: "n", isNumeric: true, isSortable: true },
  { key: "kappa", head: "Direction kappa", isNumeric: true, isSortable: true },
  { key: "observed", head: "Observed agreement", isNumeric: true, isSortable: true },
  { key: "linear", head: "Steps kappa, linear", isNumeric: true, isSortable: true },
  { key: "quadratic", head: "Steps kappa, quadratic", isNumeric: true, isSortable: true },
  { key: "tolerance", head: "Within tolerance", isNumeric: true, isSortable: true },
  { key: "biasHorizontal", head: "Bias, horizontal", isNumeric: true, isSortable: true },
  { key: "limitsHorizontal", head: "Limits, horizontal", isNumeric: true },
  { key: "biasVertical", head: "Bias, vertical", isNumeric: true, isSortable: true },
  { key: "limitsVertical", head: "Limits, vertical", isNumeric: true },
  { key: "biasSize", head: "Bias, size", isNumeric: true, isSortable: true },
  { key: "limitsSize", head: "Limits, size", isNumeric: true },
];

/** Every examiner's figures with their intervals, and what each rests on. */
export function ExaminerTable({ results }: { results: RoundResults }) {
  return (
    <DataTable
      label="Table 1"
      caption="Figures by examiner against the reference; 95 % intervals below each. Degrees: eso and right over left count positive, aligned 0; size where the direction agrees. Fewer than 20 readings: too few to say."
      columns={COLUMNS}
      isWide
      className="min-w-[92rem]"
      rows={results.examiners.map(({ personId, name, assignedAs, figures }) => ({
        id: personId,
        sortValues: { name, ...sortValues(figures) },
        cells: {
          name: (
            <>
              {name} {assignedAs === "trainee" && <span className="font-normal text-ink-2">trainee</span>}
            </>
          ),
          n: figures.readCount,
          kappa: <KappaText result={figures.kappa} />,
          observed: <ShareText result={figures.observedAgreement} />,
          linear: <KappaText result={figures.stepsLinear} />,
          quadratic: <KappaText result={figures.stepsQuadratic} />,
          tolerance: <ShareText result={figures.withinTolerance} />,
          biasHorizontal: <BiasText limits={figures.horizontal.limits} />,
          limitsHorizontal: <LimitsText limits={figures.horizontal.limits} />,
          biasVertical: <BiasText limits={figures.vertical.limits} />,
          limitsVertical: <LimitsText limits={figures.vertical.limits} />,
          biasSize: <BiasText limits={figures.size.limits} />,
          limitsSize: <LimitsText limits={figures.size.limits} />,
        },
      }))}
    />
  );
}

function sortValues({ readCount, ...figures }: ExaminerFigures) {
  const kappaOf = (result: ExaminerFigures["stepsLinear"]) => (result.ok ? result.kappa.estimate : null);
  const shareOf = (result: ExaminerFigures["withinTolerance"]) => (result.ok ? result.share.estimate : null);
  const biasOf = ({ limits }: ExaminerFigures["horizontal"]) => (limits.ok ? limits.bias.estimate : null);
  return {
    n: readCount,
    kappa: kappaOf(figures.kappa),
    observed: shareOf(figures.observedAgreement),
    linear: kappaOf(figures.stepsLinear),
    quadratic: kappaOf(figures.stepsQuadratic),
    tolerance: shareOf(figures.withinTolerance),
    biasHorizontal: biasOf(figures.horizontal),
    biasVertical: biasOf(figures.vertical),
    biasSize: biasOf(figures.size),
  };
}
