/** The role of joints that deform the model. */
export const SKIN_ROLE = 'skin';
