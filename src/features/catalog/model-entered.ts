import type { FreezerModel } from '../../../server/contract/models';

/** What the form about a model starts with. */
export const modelEnteredOf = ({ name, insideWidthIn, insideDepthIn, insideHeightIn, doors, ratedPounds, defrost, version }: FreezerModel) => ({
  name,
  insideWidthIn,
  insideDepthIn,
  insideHeightIn,
  doors,
  ratedPounds,
  defrost,
  version,
});

export type ModelEntered = ReturnType<typeof modelEnteredOf>;
