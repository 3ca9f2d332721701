type Reply = { from: string; repliedOn: string }

/**
 * Who raised a correction, as far as it is recorded: the earliest reply from before the day it was noted. Null where
 * none is, and the team may have found it itself.
 */
export function raisedBy<Said extends Reply>({
  notedOn,
  replies,
}: {
  notedOn: string
  replies: readonly Said[]
}): Said | null {
  const before = replies.filter(({ repliedOn }) => repliedOn < notedOn)
  return before.reduce<Said | null>((first, one) => (first && first.repliedOn <= one.repliedOn ? first : one), null)
}
