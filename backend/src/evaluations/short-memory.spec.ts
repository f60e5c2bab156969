import { ShortMemory } from './short-memory';

describe('short memory', () => {
  it('asks once while it remembers, and again afterwards', async () => {
    let now = 0;
    let asked = 0;
    const memory = new ShortMemory<number>(1000, 10, () => now);
    const look = () => Promise.resolve(++asked);
    expect(await memory.get('a', look)).toBe(1);
    now = 999;
    expect(await memory.get('a', look)).toBe(1);
    now = 1000;
    expect(await memory.get('a', look)).toBe(2);
  });

  it('does not remember a failure', async () => {
    const memory = new ShortMemory<number>(1000, 10, () => 0);
    await expect(memory.get('a', () => Promise.reject(new Error('down')))).rejects.toThrow('down');
    expect(await memory.get('a', () => Promise.resolve(3))).toBe(3);
  });

  it('forgets the oldest beyond its size', async () => {
    const memory = new ShortMemory<number>(1000, 2, () => 0);
    for (const [i, key] of ['a', 'b', 'c'].entries()) await memory.get(key, () => Promise.resolve(i));
    expect(await memory.get('a', () => Promise.resolve(9))).toBe(9);
  });
});
