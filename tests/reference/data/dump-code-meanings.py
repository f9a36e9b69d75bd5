"""Prints the code meanings of PS3.16 as pydicom carries them: {scheme: {code value: [meanings]}}, with the
SNOMED-RT to SNOMED-CT mapping under "SRT"."""

import json

from pydicom.sr import _concepts_dict, _snomed_dict

meanings = {}
for scheme, keywords in _concepts_dict.concepts.items():
    for codes in keywords.values():
        for value, entry in codes.items():
            meanings.setdefault(scheme, {}).setdefault(value, []).append(entry[0])
print(json.dumps({"meanings": meanings, "fromSrt": _snomed_dict.mapping["SRT"]}))
