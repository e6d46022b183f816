import { demoId } from './demo-id';

export const trialPlantingId = demoId('quillfern/planting/no-till');
export const trialId = demoId('quillfern/trial');
