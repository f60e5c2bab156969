import { fireEvent, render, screen } from '@testing-library/react';
import { allWords, boxesOverlap, drawString, textBox, type Drawing } from '@bellgap/common/drawing';
import { drawingCases, suspensionCase } from '@bellgap/common/drawing/fixtures';
import { DrawingView } from './drawing-view';

const drawingOf = ({ input, context, evaluation }: (typeof drawingCases)[number]): Drawing => {
  const drawing = drawString(input, context, evaluation);
  if (!drawing) throw new Error('nothing was drawn');
  return drawing;
};

describe('the drawing on the screen', () => {
  it('names and describes itself', () => {
    render(<DrawingView drawing={drawingOf(suspensionCase)} />);
    expect(screen.getByRole('img', { name: /17 × G160-S/ })).toHaveAccessibleDescription('');
    expect(document.querySelector('desc')?.textContent).toContain('section length 2,890 mm');
  });

  it.each(drawingCases)('shows every word and every primitive: $name', (drawingCase) => {
    const drawing = drawingOf(drawingCase);
    const { container } = render(<DrawingView drawing={drawing} />);
    expect(container.querySelectorAll('g')).toHaveLength(drawing.primitives.length);
    expect([...container.querySelectorAll('text')].map((t) => t.textContent)).toEqual(
      allWords(drawing).map((w) => w.text),
    );
  });

  it.each(drawingCases)('places no words on others: $name', (drawingCase) => {
    const drawing = drawingOf(drawingCase);
    const { container } = render(<DrawingView drawing={drawing} />);
    const boxes = [...container.querySelectorAll('text')].map((text) => {
      const number = (name: string): number => Number(text.getAttribute(name));
      const words = {
        kind: 'text',
        layer: 'note',
        text: text.textContent,
        at: { xMm: number('x'), yMm: number('y') },
        anchor: text.getAttribute('text-anchor') as 'start' | 'middle' | 'end',
        angleDeg: Number(/rotate\((-?[\d.]+)/.exec(text.getAttribute('transform') ?? '')?.[1] ?? 0),
      } as const;
      return { text: words.text, box: textBox(words, drawing.textHeightMm) };
    });
    const found = boxes.flatMap(({ text, box }, i) =>
      boxes.slice(i + 1).flatMap((other) => (boxesOverlap(box, other.box) ? [`${text} | ${other.text}`] : [])),
    );
    expect(found).toEqual([]);
  });

  it('tells which figure the pointer is on, and marks the one it is told', () => {
    const onAbout = jest.fn();
    const { container } = render(
      <DrawingView drawing={drawingOf(suspensionCase)} onAbout={onAbout} hoveredAbout="clearances.phaseToEarthMm" />,
    );
    const section = container.querySelector('[data-about="string.sectionLengthMm"]')!;
    fireEvent.pointerEnter(section);
    expect(onAbout).toHaveBeenLastCalledWith('string.sectionLengthMm');
    fireEvent.pointerLeave(section);
    expect(onAbout).toHaveBeenLastCalledWith(null);
    const strong = [...container.querySelectorAll('text[font-weight="600"]')].map((t) => t.textContent);
    expect(strong).toEqual(['to earth 1,900']);
  });
});
