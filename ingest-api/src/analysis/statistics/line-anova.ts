/** The sums of squares of a fitted line, as `fitLine` and `fitLineThroughOrigin` return them. */
export interface FittedSums {
  regressionSumOfSquares: number;
  residualSumOfSquares: number;
  degreesOfFreedom: number;
}

export interface LineAnova {
  regressionDf: number;
  residualDf: number;
  regressionMeanSquare: number;
  residualMeanSquare: number;
  /** Null when nothing is left over: the points lie on the line exactly. */
  fRatio: number | null;
}

/**
 * Analysis of variance of a line with one slope: F = regression mean square over residual mean square, 1 and ν
 * degrees of freedom. For a line through the origin the sums are those about zero.
 */
export function lineAnova({
  regressionSumOfSquares,
  residualSumOfSquares,
  degreesOfFreedom,
}: FittedSums): LineAnova {
  const residualMeanSquare = residualSumOfSquares / degreesOfFreedom;
  return {
    regressionDf: 1,
    residualDf: degreesOfFreedom,
    regressionMeanSquare: regressionSumOfSquares,
    residualMeanSquare,
    fRatio: residualMeanSquare > 0 ? regressionSumOfSquares / residualMeanSquare : null,
  };
}
