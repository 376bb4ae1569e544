// The package ships its TypeScript source in place of declarations, which our compiler settings refuse: typed beside.
import Constrainautor from "@kninnug/constrainautor";

export const constrain = (triangulation, edges) => {
  new Constrainautor(triangulation).constrainAll(edges).delaunify(true);
};
