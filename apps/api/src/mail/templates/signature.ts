/** The end of every message: plain, and without a number that could be taken for a result. */
export const SIGNATURE =
  '\n-- \nTipward, rotor blade design studio\nThis message was sent by the program; nobody reads answers to it.\n';
