"""Checks the tags of a PDF: a part of the conditions of the Matterhorn Protocol 1.1 (PDF Association) for PDF/UA-1, from memory.

Not a validator. Prints how often each tag occurs, the words of the figures and the problems; ends with 1 if there is one.
Needs the Debian package python3-pikepdf.
"""
import sys

import pikepdf

STANDARD = set(
    "Document Part Art Sect Div BlockQuote Caption TOC TOCI Index NonStruct Private P H H1 H2 H3 H4 H5 H6 L LI Lbl LBody "
    "Table TR TH TD THead TBody TFoot Span Quote Note Reference BibEntry Code Link Annot Ruby Warichu Figure Formula Form".split())
PAINT = set("f F f* S s B B* b b* sh Do Tj TJ ' \" BI".split()) | {"INLINE IMAGE"}

pdf = pikepdf.open(sys.argv[1])
root = pdf.Root
problems, counts, words, headings, annotated, marked = set(), {}, [], [], {}, {}


def need(holds, problem):
    if not holds:
        problems.add(problem)


def document():
    need(bool(root.get("/MarkInfo", {}).get("/Marked", False)), "not marked as tagged")
    need("/Lang" in root, "Lang is missing")
    need(bool(root.get("/ViewerPreferences", {}).get("/DisplayDocTitle", False)), "DisplayDocTitle is missing")
    packet = root.Metadata.read_bytes().decode("utf8")
    need("pdfuaid" in packet and "dc:title" in packet, "metadata lack the claim or the title")


def element(this, parent):
    tag = str(this.get("/S"))[1:]
    counts[tag] = counts.get(tag, 0) + 1
    need(tag in STANDARD, f"{tag} is no standard tag")
    if tag == "Figure":
        words.append(str(this.get("/Alt", "")))
        need(words[-1] != "", "Figure without words")
        need("/A" in this and "/BBox" in this.A, "Figure without a box")
    if tag[0] == "H" and tag[1:].isdigit():
        headings.append(int(tag[1:]))
    if tag == "TR":
        need(parent in ("Table", "THead", "TBody", "TFoot"), f"TR in {parent}")
    if tag in ("TH", "TD"):
        need(parent == "TR", f"{tag} in {parent}")
    if tag == "TH":
        need("/A" in this and "/Scope" in this.A, "TH without scope")
    kids = this.get("/K")
    need(kids is not None, f"{tag} is empty")
    for kid in kids if isinstance(kids, pikepdf.Array) else [] if kids is None else [kids]:
        if isinstance(kid, int):
            marked[(this.Pg.objgen, int(kid))] = this.objgen
        elif str(kid.get("/Type", "")) == "/OBJR":
            annotated[kid.Obj.objgen] = this.objgen
        elif "/MCID" in kid:
            marked[((kid.get("/Pg") or this.Pg).objgen, int(kid.MCID))] = this.objgen
        else:
            need(kid.P.objgen == this.objgen, "wrong parent")
            element(kid, tag)


def page(this, parents, seen):
    need(str(this.get("/Tabs", "")) == "/S", "Tabs do not follow the structure")
    own, open_marks = parents[int(this.StructParents)], []
    for operands, operator in pikepdf.parse_content_stream(this):
        name = str(operator)
        if name in ("BMC", "BDC"):
            if name == "BDC" and isinstance(operands[1], pikepdf.Dictionary) and "/MCID" in operands[1]:
                number = int(operands[1].MCID)
                seen.add((this.objgen, number))
                need((this.objgen, number) in marked and own[number].objgen == marked[(this.objgen, number)], "parent tree does not match")
            open_marks.append(name)
        elif name == "EMC":
            need(open_marks != [], "a mark is closed twice")
            open_marks.pop()
        elif name in PAINT:
            need(open_marks != [], f"painted without a tag: {name}")
    need(open_marks == [], "a mark stays open")
    for note in this.get("/Annots", []):
        need(note.objgen in annotated and "/StructParent" in note, "annotation without a tag")
        need("/TU" in note or "/Contents" in note, "annotation without words")


def fonts():
    for thing in pdf.objects:
        if isinstance(thing, pikepdf.Dictionary) and thing.get("/Type") == "/Font" and "/DescendantFonts" in thing:
            need("/ToUnicode" in thing, "font without letters")
            need("/FontFile2" in thing.DescendantFonts[0].FontDescriptor, "font is not embedded")


document()
tops = root.StructTreeRoot.K
for top in tops if isinstance(tops, pikepdf.Array) else [tops]:
    element(top, None)
need(all(later <= sooner + 1 for sooner, later in zip([0] + headings, headings)), "a heading level is skipped")
numbers = list(root.StructTreeRoot.ParentTree.Nums)
tree = {int(numbers[n]): numbers[n + 1] for n in range(0, len(numbers), 2)}
need(list(tree) == sorted(tree), "parent tree is out of order")
seen = set()
for one in pdf.pages:
    page(one, tree, seen)
need(seen == set(marked), "the tree names what no page holds")
fonts()
print("\n".join([f"{tag} {count}" for tag, count in counts.items()] + words + sorted(problems)))
sys.exit(1 if problems else 0)
