import fc from "fast-check";

/*
 * Property tests draw the same examples each time, so that a red run can be repeated and a green one stays green. PROPERTY_SEED=… draws others.
 */
fc.configureGlobal({ seed: Number(process.env.PROPERTY_SEED ?? 20261201) });
