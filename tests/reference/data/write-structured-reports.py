"""Writes structured reports with pydicom alone from descriptions on standard input, one JSON object a line:
{path, syntax, characterSet, undefinedLengths, header: {keyword: text}, tree: node}. A node is
{r: relationship, t: value type, c: concept, v: value, k: [nodes]}; a code is [value, scheme, meaning], a number
[text, unit code, unit scheme] or {q: code} for its qualifier, an image [class, instance, [frames]].
"""

import json
import sys
import warnings

from pydicom import config
from pydicom.dataset import Dataset, FileMetaDataset
from pydicom.filewriter import dcmwrite
from pydicom.sequence import Sequence
from pydicom.uid import UID

warnings.simplefilter("ignore")
config.settings.reading_validation_mode = config.IGNORE
config.settings.writing_validation_mode = config.IGNORE

SYNTAXES = {
    "implicit-little-endian": ("1.2.840.10008.1.2", True, True),
    "explicit-little-endian": ("1.2.840.10008.1.2.1", False, True),
    "explicit-big-endian": ("1.2.840.10008.1.2.2", False, False),
    "deflated": ("1.2.840.10008.1.2.1.99", False, True),
}


def code_of(triple):
    value, scheme, meaning = triple
    code = Dataset()
    if value.startswith("urn:"):
        code.URNCodeValue = value
    elif len(value) > 16:
        code.LongCodeValue = value
    else:
        code.CodeValue = value
    if scheme:
        code.CodingSchemeDesignator = scheme
    code.CodeMeaning = meaning
    return code


def number(item, value):
    if isinstance(value, dict):
        item.MeasuredValueSequence = Sequence([])
        item.NumericValueQualifierCodeSequence = Sequence([code_of(value["q"])])
        return
    text, unit, scheme = value
    measured = Dataset()
    measured.NumericValue = text
    measured.MeasurementUnitsCodeSequence = Sequence([code_of([unit, scheme, unit])])
    item.MeasuredValueSequence = Sequence([measured])


def image(item, value):
    reference = Dataset()
    reference.ReferencedSOPClassUID, reference.ReferencedSOPInstanceUID, frames = value
    if frames:
        reference.ReferencedFrameNumber = frames
    item.ReferencedSOPSequence = Sequence([reference])


def item_of(node, item=None):
    item = Dataset() if item is None else item
    if "r" in node:
        item.RelationshipType = node["r"]
    item.ValueType = node["t"]
    item.ConceptNameCodeSequence = Sequence([code_of(node["c"])])
    value = node.get("v")
    if node["t"] == "CONTAINER":
        item.ContinuityOfContent = "SEPARATE"
    elif node["t"] == "CODE":
        item.ConceptCodeSequence = Sequence([code_of(value)])
    elif node["t"] == "NUM":
        number(item, value)
    elif node["t"] == "IMAGE":
        image(item, value)
    else:
        keyword = {"TEXT": "TextValue", "UIDREF": "UID", "DATETIME": "DateTime", "PNAME": "PersonName"}[node["t"]]
        setattr(item, keyword, value)
    if node.get("k"):
        item.ContentSequence = Sequence([item_of(child) for child in node["k"]])
    return item


def leave_lengths_open(dataset):
    for element in dataset:
        if element.VR != "SQ":
            continue
        element.is_undefined_length = True
        for item in element.value:
            item.is_undefined_length_sequence_item = True
            leave_lengths_open(item)


def write(job):
    uid, implicit, little = SYNTAXES[job["syntax"]]
    dataset = Dataset()
    if job["characterSet"]:
        dataset.SpecificCharacterSet = job["characterSet"]
    for keyword, text in job["header"].items():
        setattr(dataset, keyword, text)
    item_of(job["tree"], dataset)
    if job["undefinedLengths"]:
        leave_lengths_open(dataset)
    dataset.file_meta = FileMetaDataset()
    dataset.file_meta.MediaStorageSOPClassUID = UID(dataset.SOPClassUID)
    dataset.file_meta.MediaStorageSOPInstanceUID = UID(dataset.SOPInstanceUID)
    dataset.file_meta.TransferSyntaxUID = UID(uid)
    dataset.is_implicit_VR = implicit
    dataset.is_little_endian = little
    dcmwrite(job["path"], dataset, write_like_original=False)


for line in sys.stdin:
    write(json.loads(line))
