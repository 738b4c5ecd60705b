/** What a lane offers to do at once; the page opens the dialog for it. */
export const laneActs = ['start', 'ready', 'collect'] as const;
export type LaneAct = (number: number, act: (typeof laneActs)[number]) => void;

export const laneActWords: Readonly<Record<(typeof laneActs)[number], string>> = {
  start: 'Start making it',
  ready: 'Mark ready',
  collect: 'Hand over',
};
