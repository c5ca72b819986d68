/** What the screen of the route shows with, fetched when somebody looks at it. */
export { costText, criterionText, faultText, orderProblemSentence, orderText, whySentence } from '../messages/route.ts';
export { triangleOf } from '../picture/triangle.ts';
export { differenceOf } from './study.ts';
export { supplyOf } from '../supply/index.ts';
