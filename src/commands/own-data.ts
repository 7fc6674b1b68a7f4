import { everyFact, withPack } from '../decide/index.ts';
import { shippedRules, type PlanOptions } from '../plan/index.ts';
import { withMaterialsFrom } from '../properties/index.ts';
import { Flags } from './base.ts';

/** Flags by which a company adds its own rules and materials. */
export const ownDataFlags = {
  rules: Flags.string({ helpValue: 'DIR', description: 'rule files of your own over ours' }),
  materials: Flags.string({ helpValue: 'DIR', description: 'material records of your own beside ours' }),
};

/**
 * The rules and materials that hold for a command line.
 *
 * @param flags  folders, as the user wrote them
 * @returns      options of `plan` and `settleCase`; what is not given is left out
 * @throws       {Problem} every fault in the user's files
 */
export function ownData(flags: { readonly rules?: string | undefined; readonly materials?: string | undefined }): Pick<PlanOptions, 'rules' | 'materials'> {
  return {
    ...(flags.rules === undefined ? {} : { rules: withPack(flags.rules, shippedRules(), everyFact()) }),
    ...(flags.materials === undefined ? {} : { materials: withMaterialsFrom(flags.materials) }),
  };
}
