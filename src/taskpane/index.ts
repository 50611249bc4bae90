import { catalogue } from "./catalogue";
import { catalogueList } from "./catalogue-list";
import "../styles/look.css";
import "./catalogue-list.css";
import "./taskpane.css";

/** Works with and without Excel around it: nothing here asks for `Office`. */
document.getElementById("functions")?.append(catalogueList(catalogue));
