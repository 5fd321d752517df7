# One species: formula, charge, state. Productions and builder names only; every reading of a spelling comes out.
# Ambiguous on purpose: `SO42-` (count 42, or count 4 and charge 2-), `CuSO4.5H2O` (count 4.5, or a hydrate).

@preprocessor typescript

@{%
import { lexer } from '../lexer.ts';
import * as build from '../builders.ts';
%}

@lexer lexer

species -> substance                     {% ([substance]) => build.species(substance, null) %}
         | substance _ %state            {% ([substance, , state]) => build.species(substance, state) %}
         | substance %arrowMark          {% ([substance, mark]) => build.species(substance, mark) %}

substance -> formula                     {% ([parts]) => build.substance(parts, null) %}
           | formula charge              {% ([parts, charge]) => build.substance(parts, charge) %}
           | %electron charge            {% ([, charge]) => build.substance(null, charge) %}
           | %dot formula                {% ([dot, parts]) => build.radical(dot, parts, null) %}
           | formula %dot                {% ([parts, dot]) => build.radical(dot, parts, null) %}
           | formula %dot charge         {% ([parts, dot, charge]) => build.radical(dot, parts, charge) %}
           | formula "^" %dot charge     {% ([parts, , dot, charge]) => build.radical(dot, parts, charge) %}
           | formula "^" "{" %dot signed "}" {% ([parts, , , dot, charge]) => build.radical(dot, parts, charge) %}

# Adducts: CuSO4*5H2O
formula -> members                       {% ([members]) => build.firstPart(members) %}
         | formula separator multiplied  {% ([before, separator, part]) => build.nextPart(before, separator, part) %}

separator -> _ %adduct _                 {% ([, token]) => token %}
           | _ %dot _                    {% ([, token]) => token %}
           | _ %period _                 {% ([, token]) => token %}

multiplied -> members                    {% ([members]) => build.part(null, members) %}
            | number members             {% ([count, members]) => build.part(count, members) %}
            | fraction members           {% ([count, members]) => build.part(count, members) %}
            | %unknown members           {% ([unknown, members]) => build.part(build.sumOf(unknown), members) %}
            | "(" sum ")" members        {% ([, sum, , members]) => build.part(sum, members) %}

# Formulas
members -> member                        {% ([member]) => build.start(member) %}
         | members member                {% ([members, member]) => build.append(members, member) %}

member -> unit                           {% ([unit]) => build.member(unit, null) %}
        | unit count                     {% ([unit, count]) => build.member(unit, count) %}

unit -> %element                         {% ([token]) => build.element(token, null) %}
      | %name                            {% ([token]) => build.name(token) %}
      | nuclide                          {% id %}
      | "(" members ")"                  {% ([open, members]) => build.group(open, members) %}
      | "[" members "]"                  {% ([open, members]) => build.group(open, members) %}
      | "{" members "}"                  {% ([open, members]) => build.group(open, members) %}

nuclide -> "[" integer %element "]"      {% ([, mass, token]) => build.element(token, mass) %}
         | "[" superInteger %element "]" {% ([, mass, token]) => build.element(token, mass) %}
         | superInteger %element         {% ([mass, token]) => build.element(token, mass) %}
         | "^" integer %element          {% ([, mass, token]) => build.element(token, mass) %}
         | "^" "{" integer "}" %element  {% ([, , mass, , token]) => build.element(token, mass) %}

# Counts
count -> number                          {% id %}
       | subNumber                       {% id %}
       | sum                             {% id %}
       | "_" number                      {% ([, number]) => number %}
       | "_" "{" number "}"              {% ([, , number]) => number %}
       | "_" "{" sum "}"                 {% ([, , sum]) => sum %}
       | "(" number ")"                  {% ([, number]) => number %}
       | "(" fraction ")"                {% ([, fraction]) => fraction %}
       | "(" sum ")"                     {% ([, sum]) => sum %}

number -> integer                        {% id %}
        | decimal                        {% id %}

integer -> %digit                        {% ([token]) => build.number(token) %}
         | integer %digit                {% ([number, token]) => build.digit(number, token) %}
         | integer %zero                 {% ([number, token]) => build.digit(number, token) %}

decimal -> integer %period %digit        {% ([number, point, token]) => build.digit(build.digit(number, point), token) %}
         | integer %period %zero         {% ([number, point, token]) => build.digit(build.digit(number, point), token) %}
         | %zero %period %digit          {% ([zero, point, token]) => build.digit(build.digit(build.number(zero), point), token) %}
         | %zero %period %zero           {% ([zero, point, token]) => build.digit(build.digit(build.number(zero), point), token) %}
         | %onePoint %digit              {% ([one, token]) => build.digit(build.number(one), token) %}
         | %onePoint %zero               {% ([one, token]) => build.digit(build.number(one), token) %}
         | decimal %digit                {% ([number, token]) => build.digit(number, token) %}
         | decimal %zero                 {% ([number, token]) => build.digit(number, token) %}

fraction -> integer %slash integer       {% ([above, slash, below]) => build.fraction(above, slash, below) %}
          | %vulgar                      {% ([token]) => build.number(token) %}

subNumber -> subInteger                  {% id %}
           | subDecimal                  {% id %}

subInteger -> %subDigit                  {% ([token]) => build.number(token) %}
            | subInteger %subDigit       {% ([number, token]) => build.digit(number, token) %}
            | subInteger %subZero        {% ([number, token]) => build.digit(number, token) %}

subDecimal -> subInteger %period subAny  {% ([number, point, token]) => build.digit(build.digit(number, point), token) %}
            | %subZero %period subAny    {% ([zero, point, token]) => build.digit(build.digit(build.number(zero), point), token) %}
            | subDecimal subAny          {% ([number, token]) => build.digit(number, token) %}

subAny -> %subDigit                      {% id %}
        | %subZero                       {% id %}

superInteger -> %superDigit              {% ([token]) => build.number(token) %}
              | superInteger %superDigit {% ([number, token]) => build.digit(number, token) %}
              | superInteger %superZero  {% ([number, token]) => build.digit(number, token) %}

# Subscripts of unknown size: 1-x, 1-x-y, 2n+2, x/2. The first or second summand is an unknown.
sum -> unknown                           {% ([summand]) => build.sum(build.start(summand)) %}
     | plain sumSign unknown                {% ([first, sign, summand]) => build.add(build.sum(build.start(first)), sign, summand) %}
     | sum sumSign unknown                  {% ([sum, sign, summand]) => build.add(sum, sign, summand) %}
     | sum sumSign plain                    {% ([sum, sign, summand]) => build.add(sum, sign, summand) %}

unknown -> %unknown                      {% ([token]) => build.summand(null, token, null) %}
         | plainNumber %unknown          {% ([factor, token]) => build.summand(factor, token, null) %}
         | %unknown %slash integer       {% ([token, , divisor]) => build.summand(null, token, divisor) %}

plain -> plainNumber                     {% ([number]) => build.summand(number, null, null) %}

plainNumber -> number                    {% id %}
             | subNumber                 {% id %}

# Charges
charge -> "^" signed                     {% ([, charge]) => charge %}
        | "^" "{" signed "}"             {% ([, , charge]) => charge %}
        | "^" "(" signed ")"             {% ([, , charge]) => charge %}
        | "(" signed ")"                 {% ([, charge]) => charge %}
        | superscript                    {% id %}
        | tight                          {% id %}
        | %space integer sign            {% ([, size, sign]) => build.charge(size, sign) %}
        | %space "^" signed              {% ([, , charge]) => charge %}
        | %space superscript             {% ([, charge]) => charge %}

signed -> size sign                      {% ([size, sign]) => build.charge(size, sign) %}
        | sign size                      {% ([sign, size]) => build.charge(size, sign) %}
        | signs                          {% id %}

size -> number                           {% id %}
      | fraction                         {% id %}

superscript -> superInteger superSign    {% ([size, sign]) => build.charge(size, sign) %}
             | superInteger sign         {% ([size, sign]) => build.charge(size, sign) %}
             | superSign superInteger    {% ([sign, size]) => build.charge(size, sign) %}
             | superPluses               {% id %}
             | superMinuses              {% id %}

tight -> %digit sign                     {% ([token, sign]) => build.tightCharge(token, sign) %}
       | sign %digit                     {% ([sign, token]) => build.tightCharge(token, sign) %}
       | signs                           {% id %}

sign -> %plus                            {% () => '+' %}
      | %minus                           {% () => '-' %}

sumSign -> sign                          {% id %}
         | %subPlus                      {% () => '+' %}
         | %subMinus                     {% () => '-' %}

superSign -> %superPlus                  {% () => '+' %}
           | %superMinus                 {% () => '-' %}

signs -> pluses                          {% id %}
       | minuses                         {% id %}

pluses -> %plus                          {% () => build.signRun('+') %}
        | pluses %plus                   {% ([run]) => build.longerRun(run) %}

minuses -> %minus                        {% () => build.signRun('-') %}
         | minuses %minus                {% ([run]) => build.longerRun(run) %}

superPluses -> %superPlus                {% () => build.signRun('+') %}
             | superPluses %superPlus    {% ([run]) => build.longerRun(run) %}

superMinuses -> %superMinus              {% () => build.signRun('-') %}
              | superMinuses %superMinus {% ([run]) => build.longerRun(run) %}

_ -> null                                {% () => null %}
   | %space                              {% () => null %}
