/** What the command line can do. */
export const help = `Copewright checks the coped, drilled end of a steel beam before it is cut.

  copewright check FILE.json [--working] [--json]   every way of failing, weakest first
  copewright check --ndjson < ends.ndjson           one report or faults a line, in order
  copewright sheet FILE.json -o out.pdf [--workings all]
                                                    the sheet for the job folder
  copewright card END.json --family UB -o card.pdf [--rows 2-8] [--json]
  copewright card END.json --sections "UB 406x178x60, UB 457x191x67" -o card.pdf
                                                    the shop card: the reaction that each section
                                                    carries with each count of bolt rows; the
                                                    end's own section, reaction and rows aside
  copewright standards [ID]                         the standards; one in full: factors, options,
                                                    every check with clause and formula
  copewright serve [--port N] [--host H]            bench and API, http://127.0.0.1:4280
  copewright help, copewright --version

  - in place of a file reads standard input.
  Exit status: 0 all hold; 1 some end fails or refers; 2 input not understood.
  A card that was made gives 0.
`;
