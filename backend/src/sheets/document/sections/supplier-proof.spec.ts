import { drawingCases, postUnit, suspensionCase, type DrawingCase } from '@bellgap/common/drawing/fixtures';
import { draftContent } from '../fixtures';
import { requiredValues } from './required-values';
import { supplierProof } from './supplier-proof';

const post = drawingCases.find(({ context }) => context.insulator.kind === 'line-post')!;
const wordsOf = (blocks: unknown): string => JSON.stringify(blocks);
const proof = (drawingCase: DrawingCase): string => wordsOf(supplierProof(draftContent(drawingCase)));

describe('what the supplier guarantees', () => {
  it('is the failing load of a unit of a string', () => {
    expect(proof(suspensionCase)).toContain('Failing load of a unit');
    expect(proof(suspensionCase)).not.toContain('Bending');
  });

  it('is the strength in bending of a post, and never called a failing load of a unit', () => {
    const words = proof(post);
    expect(words).toContain('Bending (cantilever) strength of a post, at least');
    expect(words).toContain('10 kN');
    expect(words).toContain('Creepage of the post, at least');
    expect(words).toContain('complete post with its fittings');
    expect(words).not.toContain('Failing load of a unit');
    const front = wordsOf(requiredValues(draftContent(post)));
    expect(front).toContain('Bending strength of a post');
    expect(front).not.toContain('Failing load');
  });

  it('says so where the catalogue has no strength in bending', () => {
    const without = { ...post, context: { insulator: postUnit({ cantileverStrengthKn: null }) } };
    expect(proof(without)).toContain('not stated');
  });
});
