/** What no figure of this program has looked at; every sheet, result and export says it. */
export const NOT_CHECKED =
  "Not checked: local, lateral and torsional-flexural buckling, web bearing, connections, fatigue, fire, corrosion, the factors of any code. Local codes and a licensed engineer decide.";
