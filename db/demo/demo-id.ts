import { v5 } from 'uuid';

/** Any fixed uuid serves as the space in which the demo's names become ids. */
const demoSpace = '5b0c9d0a-6f43-4d53-9a6e-0d2c3c1f7e11';

/** The id of a demo thing, made from its name, so that a test or a second filling names the same things. */
export const demoId = (name: string) => v5(`rowrise demo ${name}`, demoSpace);
