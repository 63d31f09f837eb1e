"""Shapes of chain, and of chain then rope, in 50 decimal digits: a witness for the solver, on Python's library alone.

Run in this folder: `python3 shapes.py check` compares with catenary.json; `python3 shapes.py > extremes.json` writes the
extreme cases. Unknown: the vertical force at the foot of the hanging part, or the length that hangs; found by halving.
"""
import json
import sys
from decimal import Decimal as D, getcontext

getcontext().prec = 50


def asinh(x):
    return (x + (1 + x * x).sqrt()).ln()


def part(length, weight, foot, load, ea=None):
    """Span, height and upper vertical force of a hanging part; ea in N where it stretches."""
    top = foot + weight * length
    low, high = (load ** 2 + foot ** 2).sqrt(), (load ** 2 + top ** 2).sqrt()
    if weight == 0:
        span, rise = length * load / low, length * foot / low
    else:
        span = load / weight * (asinh(top / load) - asinh(foot / load))
        rise = (high - low) / weight
    if ea is not None:
        span += load * length / ea
        rise += (foot + top) / 2 * length / ea
    return span, rise, top


def halve(rise_at, height, low, high):
    for _ in range(180):
        middle = (low + high) / 2
        if rise_at(middle) < height:
            low = middle
        else:
            high = middle
    return (low + high) / 2


def shape(height, load, chain, rope, ea=None):
    """chain and rope are (length, weight per metre)."""
    def hang(chain_m, rope_m, foot):
        x1, y1, join = part(chain_m, chain[1], foot, load, ea)
        x2, y2, bow = part(rope_m, rope[1], join, load, ea)
        return x1 + x2, y1 + y2, bow

    foot, chain_m, rope_m = D(0), chain[0], rope[0]
    if hang(chain_m, rope_m, foot)[1] < height:
        foot = halve(lambda v: hang(chain_m, rope_m, v)[1], height, D(0), D(10) ** 12)
    elif part(rope_m, rope[1], D(0), load, ea)[1] < height:
        chain_m = halve(lambda m: hang(m, rope_m, D(0))[1], height, D(0), chain_m)
    else:
        chain_m = D(0)
        rope_m = halve(lambda m: hang(D(0), m, D(0))[1], height, D(0), rope_m)
    span, _, bow = hang(chain_m, rope_m, foot)
    lying = chain[0] - chain_m + rope[0] - rope_m
    return {
        'chainOnSeabedM': chain[0] - chain_m,
        'ropeOnSeabedM': rope[0] - rope_m,
        'spanM': span + lying * (1 + (load / ea if ea else 0)),
        'tensionBowN': (load ** 2 + bow ** 2).sqrt(),
        'tensionAnchorN': (load ** 2 + foot ** 2).sqrt(),
        'verticalAnchorN': foot,
        'verticalBowN': bow,
    }


names = {
    'chainOnSeabedM': 'chain_on_seabed_m', 'ropeOnSeabedM': 'rope_on_seabed_m', 'spanM': 'horizontal_distance_m',
    'tensionBowN': 'tension_bow_N', 'tensionAnchorN': 'tension_anchor_N', 'verticalAnchorN': 'vertical_anchor_N',
    'verticalBowN': 'vertical_bow_N',
}


def check():
    with open('catenary.json') as file:
        checks = json.load(file, parse_float=D, parse_int=D)
    worst = D(0)
    for case in checks['cases']:
        given, printed = case['inputs'], case['outputs']
        got = shape(given['height_seabed_to_bow_m'], given['horizontal_load_N'],
                    (given['chain_length_m'], given['chain_submerged_weight_N_per_m']),
                    (given['rope_length_m'], given['rope_submerged_weight_N_per_m']))
        for ours, theirs in names.items():
            worst = max(worst, abs(got[ours] - printed[theirs]))
    for case in checks['elastic']:
        given, printed = case['inputs'], case['outputs']
        got = shape(given['height_m'], given['horizontal_load_N'],
                    (given['unstretched_length_m'], given['submerged_weight_N_per_m_unstretched']), (D(0), D(0)), given['EA_N'])
        for ours in ('spanM', 'tensionBowN', 'tensionAnchorN'):
            worst = max(worst, abs(got[ours] - printed[names[ours]]))
    print(f'largest difference from the printed digits: {worst:.2e}')
    assert worst < D('1e-6')


# note, height, load, chain, rope
extremes = [
    ('hanging almost straight down: next to no load', '20', '0.01', ('21', '11.9'), ('0', '0')),
    ('almost straight down, one part in a million to spare', '30', '50', ('30.00003', '11.9'), ('0', '0')),
    ('one part in a thousand million to spare, with rope', '30', '5', ('10', '11.9'), ('20.00000003', '0.12')),
    ('bar-taut: a hundred times the load that lifts it', '10', '500000', ('60', '11.9'), ('0', '0')),
    ('bar-taut, chain and weightless rope', '8', '400000', ('10', '11.9'), ('60', '0')),
    ('next to weightless chain', '8', '1000', ('40', '0.000001'), ('0', '0')),
    ('weightless rope alone', '8', '1000', ('0', '0'), ('40', '0')),
    ('weightless rope, part of the chain on the bottom', '8', '300', ('30', '11.9'), ('35', '0')),
    ('weightless chain under weighted rope', '8', '300', ('10', '0'), ('50', '0.5')),
    ('weightless chain, part of the rope on the bottom', '3', '50', ('10', '0'), ('80', '3')),
    ('a thousand times the height, slack', '2', '3', ('2000', '20'), ('0', '0')),
    ('rope heavier than the chain', '6', '900', ('12', '2'), ('30', '14')),
    ('a hair past lifting', '10', '1440.0001', ('50', '12'), ('0', '0')),
    ('a hair before lifting', '10', '1439.9999', ('50', '12'), ('0', '0')),
]


def write():
    cases = []
    for note, height, load, chain, rope in extremes:
        got = shape(D(float(height)), D(float(load)), *(tuple(D(float(one)) for one in line) for line in (chain, rope)))
        cases.append({
            'note': note, 'heightM': float(height), 'horizontalLoadN': float(load),
            'chain': {'lengthM': float(chain[0]), 'weightNPerM': float(chain[1])},
            'rope': {'lengthM': float(rope[0]), 'weightNPerM': float(rope[1])},
            'expected': {name: float(value) for name, value in got.items()},
        })
    source = 'shapes.py: the closed form in 50 decimal digits, unknowns by halving; printed to double precision'
    print(json.dumps({'source': source, 'cases': cases}, indent=1))


check() if sys.argv[1:] == ['check'] else write()
