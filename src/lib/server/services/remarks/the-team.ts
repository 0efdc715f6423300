/** How a member's name stands for readers of a blind link. */
export const THE_TEAM = 'The team';
