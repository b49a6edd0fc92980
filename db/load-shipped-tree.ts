// Run by the start command with DATABASE_URL, the owner's address: puts the tree in trees/ into the database if it changed.
import { loadShippedTree } from "@/lib/server/trees/load-shipped-tree";

const url = process.env.DATABASE_URL;
if (!url) throw new Error("DATABASE_URL is not set: the owner's address is needed to load the shipped tree.");
const { number, isNew } = await loadShippedTree(url);
if (isNew) console.log(`the shipped fault tree is loaded as version ${number}`);
