/* What the part for proof loads when it is first asked: the audit, the second library, the writers of reports. */
export { checkBook } from "./checkBook";
export { liveAnswers } from "./liveAnswers";
export { reportFile } from "./reportFile";
export { workingsOf } from "./workingsOf";
