/** Does all the work, a few pieces at a time, and fails with the first that fails. */
export async function inParallel<Item>(items: readonly Item[], atOnce: number, work: (item: Item) => Promise<void>): Promise<void> {
  const waiting = [...items];
  const worker = async () => {
    for (let item = waiting.shift(); item !== undefined; item = waiting.shift()) await work(item);
  };
  await Promise.all(Array.from({ length: atOnce }, worker));
}
