/** The heavy part of the proof: it comes when it is first asked for, so that opening the pane stays as quick as without it. */
export const loadProof = () => import(/* webpackChunkName: "proof" */ "./proofWork");
