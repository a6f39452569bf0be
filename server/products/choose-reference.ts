import type { PersonActor } from '../actor';
import { recordAudit } from '../audit/record-audit';
import { findBuild } from '../builds/find-build';
import type { Context } from '../context';
import { withTransaction } from '../db/with-transaction';
import { markStale } from '../judging/mark-stale';
import { requestJudging } from '../judging/request-judging';
import type { FoundProduct } from './find-product';
import { insertReferenceChoice, updateProduct } from './product-store';

/**
 * Makes a build the reference of its product, or with null goes back to the pooled mean; every build is judged anew.
 *
 * @throws ServiceError `notFound` when the product has no such build
 */
export function chooseReference(
  context: Context,
  person: PersonActor,
  { product }: FoundProduct,
  choice: { buildId: number | null; reason: string },
): void {
  const build = choice.buildId === null ? null : findBuild(context, product.id, choice.buildId);
  const name = build === null ? 'the pooled mean of builds judged held' : `${build.hardware} / ${build.firmware}`;
  withTransaction(context.db, () => {
    updateProduct(context.db, product.id, { referenceBuildId: choice.buildId });
    insertReferenceChoice(context.db, {
      ...choice,
      productId: product.id,
      chosenBy: person.personId,
      chosenAt: context.now(),
    });
    markStale(context, product.id, 1);
    requestJudging(context, person, product, 'person');
    recordAudit(context, person, {
      teamId: product.teamId,
      action: 'reference.chosen',
      subjectKind: 'product',
      subjectId: product.id,
      summary: `Reference of ${product.key} is ${name}: ${choice.reason}`,
      details: { before: product.referenceBuildId, now: choice.buildId },
    });
  });
}
