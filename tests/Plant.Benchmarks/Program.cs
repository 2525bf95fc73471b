Console.WriteLine("skeleton");
