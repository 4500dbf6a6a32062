import type { PlantDrawing } from "./plantDrawing.ts";

export type VarietyKind = "lettuce" | "herb" | "leafy_green" | "allium";
export type VarietyDrawing = { slug: string; name: string; kind: VarietyKind; drawing: PlantDrawing };

type Form = Omit<PlantDrawing, "colours" | "veinColour">;
type Numbers = [number, number, number, number, number, number, number, number, number, number];

function form(habit: Form["habit"], leaf: Form["leaf"], numbers: Numbers): Form {
  const [leafLength, leafWidth, shoulder, roundness, lobe, lobes, frill, leaves, spread, rib] = numbers;
  return { habit, leaf, leafLength, leafWidth, shoulder, roundness, lobe, lobes, frill, leaves, spread, rib };
}

/** The shapes, which red and green sorts share. */
// prettier-ignore
const forms = {
  //                                  long wide shoulder round lobe lobes frill leaves spread rib
  butterhead: form("head", "blade",  [ 88,  62,      62,   82,   0,    0,    6,    16,    80, 14]),
  oakleaf: form("head", "blade",     [ 90,  58,      66,   82,  54,    3,    4,    14,    72, 12]),
  romaine: form("head", "blade",     [ 98,  36,      66,   70,   0,    0,   10,    14,    34, 34]),
  frill: form("head", "blade",       [ 84,  66,      74,   88,   0,    0,   86,    14,    76,  8]),
  crisp: form("head", "blade",       [ 90,  58,      68,   84,   0,    0,   40,    13,    66, 22]),
  basil: form("sprig", "blade",      [ 40,  62,      45,   62,   0,    0,    2,    22,    60, 20]),
  smallBasil: form("sprig", "blade", [ 38,  40,      42,   35,   0,    0,    2,    26,    66, 14]),
  mint: form("sprig", "blade",       [ 36,  56,      42,   40,   0,    0,   30,    22,    50, 18]),
  parsley: form("stalk", "hand",     [ 94,  62,      56,   32,  56,    2,    0,     8,    72,  8]),
  curledParsley: form("stalk", "hand",[ 88,  86,      58,   92,   0,    0,  100,     8,    72,  8]),
  cilantro: form("stalk", "hand",    [ 94,  84,      66,   72,  44,    2,    0,     8,    78,  4]),
  dill: form("sprig", "thread",      [ 44,  56,      50,   40,   0,    4,    0,    18,    60,  6]),
  arugula: form("rosette", "blade",  [ 96,  32,      76,   70,  66,    3,    0,     9,    64, 12]),
  sorrel: form("stalk", "blade",     [100,  54,      44,   40,   0,    0,    3,    10,    62, 14]),
  kale: form("stalk", "blade",       [ 96,  58,      60,   80,   0,    0,  100,     9,    66, 26]),
  chard: form("stalk", "blade",      [100,  62,      48,   70,   0,    0,   20,     8,    56, 56]),
  mizuna: form("rosette", "blade",   [ 98,  34,      62,   25,  74,    5,    0,     9,    66, 20]),
  chives: form("stalk", "tube",      [ 98,   3,      40,   30,   0,    0,    0,    26,    44,  0]),
  onion: form("stalk", "tube",       [100,   8,      30,   30,   0,    0,    0,     9,    34, 70]),
};

/** Twenty-four common greens and the numbers that make each recognisable. */
export const varietyDrawings: VarietyDrawing[] = [
  {
    slug: "butterhead",
    name: "Butterhead",
    kind: "lettuce",
    drawing: { ...forms.butterhead, colours: ["#6E9B36", "#9CC25C", "#DDEBA8"], veinColour: "#E7F1C4" },
  },
  {
    slug: "red-butterhead",
    name: "Red butterhead",
    kind: "lettuce",
    drawing: { ...forms.butterhead, colours: ["#7A2038", "#A8505C", "#CFDA92"], veinColour: "#F0CFC8" },
  },
  {
    slug: "green-oakleaf",
    name: "Green oakleaf",
    kind: "lettuce",
    drawing: { ...forms.oakleaf, colours: ["#5B8F2E", "#86B545", "#C6DD84"], veinColour: "#E3EFC0" },
  },
  {
    slug: "red-oakleaf",
    name: "Red oakleaf",
    kind: "lettuce",
    drawing: { ...forms.oakleaf, colours: ["#6A1535", "#9A2C4F", "#8FA84B"], veinColour: "#E9BFC8" },
  },
  {
    slug: "little-romaine",
    name: "Little romaine",
    kind: "lettuce",
    drawing: { ...forms.romaine, colours: ["#3F741F", "#6F9E3C", "#CFE09A"], veinColour: "#E6F0C8" },
  },
  {
    slug: "red-romaine",
    name: "Red romaine",
    kind: "lettuce",
    drawing: { ...forms.romaine, colours: ["#5B1630", "#8A2F48", "#7E9A45"], veinColour: "#E8D3C4" },
  },
  {
    slug: "green-frill",
    name: "Green frill",
    kind: "lettuce",
    drawing: { ...forms.frill, colours: ["#5E9A2A", "#93C24E", "#DDEDA6"], veinColour: "#EAF4CC" },
  },
  {
    slug: "red-frill",
    name: "Red frill",
    kind: "lettuce",
    drawing: { ...forms.frill, colours: ["#701A3A", "#A23357", "#A8BE5E"], veinColour: "#F0CBD2" },
  },
  {
    slug: "batavian-crisp",
    name: "Batavian crisp",
    kind: "lettuce",
    drawing: { ...forms.crisp, colours: ["#76903A", "#A6BF58", "#E6EDB4"], veinColour: "#F2F5DA" },
  },
  {
    slug: "sweet-basil",
    name: "Sweet basil",
    kind: "herb",
    drawing: { ...forms.basil, colours: ["#2F6A2B", "#3F7F33", "#5FA043"], veinColour: "#8FBF6A" },
  },
  {
    slug: "purple-basil",
    name: "Purple basil",
    kind: "herb",
    drawing: { ...forms.basil, colours: ["#3B1B3E", "#56285A", "#6F3A70"], veinColour: "#A06FA0" },
  },
  {
    slug: "lemon-basil",
    name: "Lemon basil",
    kind: "herb",
    drawing: { ...forms.smallBasil, colours: ["#6E9E2F", "#8DB93F", "#B2D25A"], veinColour: "#D2E58F" },
  },
  {
    slug: "mint",
    name: "Mint",
    kind: "herb",
    drawing: { ...forms.mint, colours: ["#2C7350", "#3E8B60", "#63A878"], veinColour: "#7A4A5C" },
  },
  {
    slug: "flat-parsley",
    name: "Flat parsley",
    kind: "herb",
    drawing: { ...forms.parsley, colours: ["#2F6F2A", "#3F8534", "#5FA044"], veinColour: "#8FBF68" },
  },
  {
    slug: "curled-parsley",
    name: "Curled parsley",
    kind: "herb",
    drawing: { ...forms.curledParsley, colours: ["#2E6B2C", "#417F35", "#5C9B48"], veinColour: "#86B566" },
  },
  {
    slug: "cilantro",
    name: "Cilantro",
    kind: "herb",
    drawing: { ...forms.cilantro, colours: ["#4B8B33", "#66A342", "#8BBF5B"], veinColour: "#A9CF7E" },
  },
  {
    slug: "dill",
    name: "Dill",
    kind: "herb",
    drawing: { ...forms.dill, colours: ["#3F7A4A", "#56935A", "#79AE6C"], veinColour: "#6C9F5C" },
  },
  {
    slug: "arugula",
    name: "Arugula",
    kind: "leafy_green",
    drawing: { ...forms.arugula, colours: ["#3F7A2C", "#5A9539", "#83B354"], veinColour: "#BBD79A" },
  },
  {
    slug: "red-veined-sorrel",
    name: "Red-veined sorrel",
    kind: "leafy_green",
    drawing: { ...forms.sorrel, colours: ["#4F8A34", "#6BA343", "#93C063"], veinColour: "#8A1C44" },
  },
  {
    slug: "curly-kale",
    name: "Curly kale",
    kind: "leafy_green",
    drawing: { ...forms.kale, colours: ["#2F5E46", "#3F7453", "#5F9268"], veinColour: "#BFD8B4" },
  },
  {
    slug: "red-chard",
    name: "Red-stalked chard",
    kind: "leafy_green",
    drawing: { ...forms.chard, colours: ["#2F6330", "#3F7A38", "#5E9A48"], veinColour: "#B8204E" },
  },
  {
    slug: "mizuna",
    name: "Mizuna",
    kind: "leafy_green",
    drawing: { ...forms.mizuna, colours: ["#5B9A3A", "#7DB34C", "#A7CF73"], veinColour: "#E3EED0" },
  },
  {
    slug: "chives",
    name: "Chives",
    kind: "allium",
    drawing: { ...forms.chives, colours: ["#3C7A3B", "#4F9048", "#78AE5E"], veinColour: "#78AE5E" },
  },
  {
    slug: "green-onion",
    name: "Green onion",
    kind: "allium",
    drawing: { ...forms.onion, colours: ["#2F7048", "#438A55", "#74AC66"], veinColour: "#F3F6E4" },
  },
];
