import { graetzEntry } from './graetz-entry.ts';
import { pipeSection } from './graetz-series.ts';

export const graetzPipe = graetzEntry({
  flow: 'pipe',
  section: pipeSection,
  where: 'in a round pipe',
  chapter: 'V',
  on: 'the diameter',
  lengthName: 'diameter',
  formulas: {
    local: 'Nu = sum G_n e_n/[2 sum G_n/lambda_n^2 e_n], e_n = exp(-2 lambda_n^2 x*)',
    bulk: 'theta_b = 8 sum G_n/lambda_n^2 exp(-2 lambda_n^2 x*)',
    flux: 'Nu = 1/[11/48 + (1/2) sum b_n exp(-2 beta_n^2 x*)]',
  },
});
