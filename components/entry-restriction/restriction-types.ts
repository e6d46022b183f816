export type RestrictionData = {
  id: string;
  product: string;
  endedOn: string;
  endedAt: string;
  hours: number;
  personName: string;
  untilOn: string;
  untilAt: string;
  isOver: boolean;
  exceptions: readonly { id: string; enteredOn: string; exception: string; equipment: string; personName: string }[];
};
