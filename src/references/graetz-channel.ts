import { graetzEntry } from './graetz-entry.ts';
import { channelSection } from './graetz-series.ts';

export const graetzChannel = graetzEntry({
  flow: 'channel',
  section: channelSection,
  where: 'between parallel plates',
  chapter: 'VI',
  on: 'twice the gap',
  lengthName: 'twice the gap',
  formulas: {
    local: 'Nu = (8/3) sum G_n e_n/sum G_n/lambda_n^2 e_n, e_n = exp(-(32/3) lambda_n^2 x*)',
    bulk: 'theta_b = 3 sum G_n/lambda_n^2 exp(-(32/3) lambda_n^2 x*)',
    flux: 'Nu = 4/[17/35 + sum b_n exp(-(32/3) beta_n^2 x*)]',
  },
});
