/** Part of the unknown's answers that follows the causes of the tree; the rest is even. */
const LIKE_THE_CAUSES = 0.8;

/**
 * What "something not in this tree" would show at a check. Rules [K2], [K3].
 *
 * It looks as usual as a sound engine: the check was made for the causes that
 * are in the tree, so usual findings speak for something that is not. What is
 * left for unusual findings is spread like the causes' own, one fifth evenly,
 * so that one odd finding does not make it explode.
 *
 * @param mean the causes' mean row, weighted by how common they are.
 * @param usual index of the usual finding, or -1.
 */
export function unknownRow(sound: Float64Array, mean: Float64Array, usual: number): Float64Array {
  if (usual < 0) return mean.map((share) => LIKE_THE_CAUSES * share + (1 - LIKE_THE_CAUSES) / mean.length);
  const soundUsual = sound[usual] ?? 0;
  const unusualMean = 1 - (mean[usual] ?? 0);
  const even = 1 / (sound.length - 1);
  return mean.map((share, index) => {
    if (index === usual) return soundUsual;
    const like = unusualMean > 0 ? share / unusualMean : even;
    return (1 - soundUsual) * (LIKE_THE_CAUSES * like + (1 - LIKE_THE_CAUSES) * even);
  });
}
