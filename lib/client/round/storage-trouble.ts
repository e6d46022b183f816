/** Why the phone's store refused: its room is used up, or it does not take anything at all (a private window, a broken profile). */
export function storageTrouble(error: unknown): 'storage-full' | 'storage-refused' {
  for (let each: unknown = error, depth = 0; each instanceof Error && depth < 5; depth += 1) {
    if (/quota/i.test(each.name) || /quota|disk|full/i.test(each.message)) return 'storage-full';
    each = 'inner' in each && each.inner instanceof Error ? each.inner : each.cause;
  }
  return 'storage-refused';
}
