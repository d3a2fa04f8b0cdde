/** Every style, in the order they are offered. */
import { bell } from "@/lib/drafting/styles/bell";
import { bishop } from "@/lib/drafting/styles/bishop";
import { cap } from "@/lib/drafting/styles/cap";
import { type StyleRecipe } from "@/lib/drafting/styles/context";
import { flounced } from "@/lib/drafting/styles/flounced";
import { gatheredHead } from "@/lib/drafting/styles/gathered-head";
import { gatheredHem } from "@/lib/drafting/styles/gathered-hem";
import { lantern } from "@/lib/drafting/styles/lantern";
import { legOfMutton } from "@/lib/drafting/styles/leg-of-mutton";
import { petal } from "@/lib/drafting/styles/petal";
import { plain } from "@/lib/drafting/styles/plain";
import { puff } from "@/lib/drafting/styles/puff";
import { statement } from "@/lib/drafting/styles/statement";
import { tiered } from "@/lib/drafting/styles/tiered";

export const recipes: readonly StyleRecipe[] = [
  plain,
  gatheredHead,
  gatheredHem,
  puff,
  legOfMutton,
  statement,
  bishop,
  bell,
  flounced,
  petal,
  lantern,
  cap,
  tiered,
];

/** @throws where there is no such style. */
export function recipeOf(id: string): StyleRecipe {
  const found = recipes.find((recipe) => recipe.id === id);
  if (!found) throw new Error(`There is no style named ${id}`);
  return found;
}
