/** Cautions shown where the advice of a finding leads into their hazard. */
export const CAUTIONS = {
  resistance: 'Disconnect battery and display before resistance checks.',
  heat: 'Heat guns and hot probes burn; no flame or heat gun near fuel vapour.',
  cold: 'That all channels agree when cold proves nothing about alloy, polarity or type.',
} as const

/** What a run without findings proves, and what it does not. */
export const NO_FINDINGS = {
  title: 'Nothing found in the record',
  proves:
    'As logged, every conductor and contact is what the planned type asks for, and the display is set to match.',
  doesNotProve:
    'This judges what was written down, not the wire itself: cable of another alloy under the right name, or a pair swapped and not noticed, looks the same here. Only checks on the aircraft prove the channel.',
  caution: CAUTIONS.cold,
} as const
