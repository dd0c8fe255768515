using Credtrack.Core.Rulebooks;

namespace Credtrack.Web.Features.SignIn.Demo;

/// <summary>Thresholds invented for the demonstration, so that every kind of gap can be seen.</summary>
internal static class DemoRulebooks
{
    public static Rulebook Emergency(Person by, Programme programme, DateTime now) => Rulebook.Publish(by, programme, "Brindlemoor emergency", 4, """
        {
          "format": "credtrack-rulebook/1", "name": "Brindlemoor emergency", "version": 4, "effective": "2025-07-01", "timeZone": "Europe/Dublin",
          "notes": "Invented for the demonstration. Local rules and licensed people decide.",
          "counting": { "role": ["performed"], "quality": { "min": 3 }, "views": true }, "introductory": 1,
          "applications": [
            { "code": "efast", "require": [{ "kind": "count", "min": 25 }, { "kind": "count", "min": 3, "where": { "positive": true } }] },
            { "code": "cardiac", "require": [{ "kind": "count", "min": 25 }, { "kind": "share", "where": { "indicated": true }, "min": 0.5 }] },
            { "code": "ivc", "require": [{ "kind": "count", "min": 10 }] },
            { "code": "aorta", "require": [{ "kind": "count", "min": 15 }, { "kind": "count", "min": 5, "where": { "positive": true } }] },
            { "code": "lung", "require": [{ "kind": "count", "min": 20 }] },
            { "code": "biliary", "require": [{ "kind": "count", "min": 15 }] },
            { "code": "renal", "require": [{ "kind": "count", "min": 15 }] },
            { "code": "early-pregnancy", "require": [{ "kind": "count", "min": 15 }] },
            { "code": "dvt", "require": [{ "kind": "count", "min": 15 }] },
            { "code": "soft-tissue", "caps": [{ "where": { "setting": ["education"] }, "max": 2, "label": "at most 2 teaching scans" }], "require": [{ "kind": "count", "min": 15 }] },
            { "code": "ocular", "require": [{ "kind": "count", "min": 10 }] },
            { "code": "piv", "counting": { "views": null }, "require": [{ "kind": "count", "min": 10 }] }
          ],
          "overall": [{ "kind": "count", "min": 150 }]
        }
        """, now.AddMonths(-13));

    public static Rulebook Medicine(Person by, Programme programme, DateTime now) => Rulebook.Publish(by, programme, "Brindlemoor ward", 2, """
        {
          "format": "credtrack-rulebook/1", "name": "Brindlemoor ward", "version": 2, "effective": "2025-09-01", "timeZone": "Europe/Dublin",
          "notes": "Invented for the demonstration. Local rules and licensed people decide.",
          "counting": { "quality": { "min": 3 } },
          "applications": [
            { "code": "cardiac", "require": [{ "kind": "count", "min": 30 }] },
            { "code": "ivc", "require": [{ "kind": "count", "min": 10 }] },
            { "code": "lung", "require": [{ "kind": "count", "min": 30 }, { "kind": "share", "where": { "supervision": ["direct"] }, "min": 0.1 }] },
            { "code": "renal", "require": [{ "kind": "count", "min": 10 }] },
            { "code": "thoracentesis", "require": [{ "kind": "count", "min": 5 }] },
            { "code": "paracentesis", "require": [{ "kind": "count", "min": 5 }] }
          ],
          "overall": [{ "kind": "applications", "min": 4, "meeting": "own" }]
        }
        """, now.AddMonths(-13));
}
