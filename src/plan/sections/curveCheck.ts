import { NUMBER_FORMATS } from "../../sheet/cellLook";
import type { PlanLine } from "../planModel";
import { result } from "./result";

const { decimals, fine, whole } = NUMBER_FORMATS;
/** More scores the test doesn't take. */
const MOST_SHAPIRO = 5000;
const FEW = '"too few scores"';

/** Whether the scores follow the curve that is taken for them. */
export function curveCheck(): PlanLine[] {
  return [
    { kind: "section", text: "Is the curve what you take it for" },
    result("mean", "Mean", 'WEIR.SCORE_SUMMARY(weir_scores,"mean")', decimals, "In score points."),
    result(
      "sd",
      "Standard deviation",
      'WEIR.SCORE_SUMMARY(weir_scores,"standard deviation")',
      decimals,
      "In score points, divisor n − 1.",
    ),
    result(
      "curve_p",
      "p-value of the curve",
      'WEIR.SCORE_CURVE(weir_scores,weir_shape,"Anderson-Darling p-value")',
      fine,
      "Anderson-Darling. Small: the shape hardly fits. Empty below 8 scores and with a fitted power.",
    ),
    result(
      "curve_verdict",
      "So the shape",
      'IF(ISNUMBER(weir_curve_p),IF(weir_curve_p<5%,"is doubtful","may hold"),"can\'t be judged")',
      undefined,
      "Doubtful below 5 %. “May hold” is no proof, least of all with few scores.",
    ),
    result(
      "normal_p",
      "p-value of a normal curve",
      `IF(weir_count<3,${FEW},WEIR.NORMALITY_CHECK(weir_scores,IF(weir_count>${MOST_SHAPIRO},"anderson-darling","shapiro-wilk"),"p-value"))`,
      fine,
      "Shapiro-Wilk (above 5,000 scores Anderson-Darling), whatever shape is taken above.",
    ),
    result(
      "best_shape",
      "Shape that fits best",
      `IF(weir_count<5,${FEW},INDEX(WEIR.SHAPE_RANKING(weir_scores),2,1))`,
      undefined,
      "By AICc, of normal, lognormal and boxcox. Picked by looking, it makes the limits too narrow.",
    ),
    result(
      "outliers",
      "Scores that stand out",
      `IF(weir_count<10,${FEW},SUMPRODUCT(--(WEIR.OUTLIER_FLAGS(weir_scores,,,weir_shape)=TRUE)))`,
      whole,
      "Look at each of them: a slip of the pen, or a real one?",
    ),
  ];
}
