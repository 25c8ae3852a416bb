/** Short plain words of four to seven letters, easy to read aloud and to type: 128 of them, so each says 7 bits. */
export const words: readonly string[] = [
  'acorn alder amber anvil apple arrow aspen autumn badger barley basin beaver birch bison bottle branch',
  'bridge briar bucket butter candle canyon carrot cedar cherry clover cobble copper cotton cricket daisy dapple',
  'donkey dragon drover eagle ember engine falcon feather fennel ferry fiddle finch flint forest fossil garden',
  'ginger granite gravel hammer harbor harvest hazel heather heron hickory hollow honey indigo island ivory jacket',
  'juniper kernel kettle ladder lantern larch laurel lemon lichen linden locust lumber maple marble marsh meadow',
  'melon mill mineral mirror mitten mossy nettle nickel nutmeg oaken oats orchard otter paddle parsley pasture',
  'pebble pepper pigeon pillow plum pocket poplar potter prairie quarry quartz quill rabbit raven ribbon river',
  'rocket saddle saffron salmon sandal shovel silver sorrel sparrow spruce summer teasel thistle timber walnut willow',
].flatMap((line) => line.split(' '))
