namespace Credtrack.Core.Scans;

/// <summary>The trainee's part in the examination.</summary>
public enum Role { Performed, Interpreted }

public enum Setting { Clinical, Education, Simulation }

/// <summary>In order: a reader may lower it, nobody may raise it.</summary>
public enum Supervision { None, Later, Direct }
